// SPDX-License-Identifier: Apache-2.0
package tariff.service.request;

import java.util.Optional;
import tariff.rate.Rate;
import tariff.rate.clause.Nearest;
import tariff.rate.clause.Written;
import tariff.service.shelf.Shelf;

/** The id of a rate that is kept here. */
final class RateId {
    private RateId() {}

    /** The rate that it names; a finding that names the nearest if there is none. */
    static Optional<Rate> read(Written in, Shelf shelf) {
        Optional<Rate> rate = shelf.rate(in.text());
        if (rate.isEmpty()) {
            in.wrong(
                    "unknown-rate",
                    "is not the id of a rate"
                            + Nearest.hint(in.text(), shelf.rates().keySet()),
                    Nearest.list(shelf.rates().keySet()));
        }
        return rate;
    }
}
