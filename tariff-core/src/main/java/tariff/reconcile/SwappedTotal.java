// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.math.BigDecimal;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import tariff.meter.Charged;
import tariff.meter.MeteredMonth;

/** Two neighbouring digits of the charged total stand in each other's place. */
record SwappedTotal() implements Cause {

    @Override
    public String code() {
        return "total-digits-swapped";
    }

    @Override
    public Stream<Trial> trials(Case bills) {
        return bills.open().stream().flatMap(place -> {
            MeteredMonth month = bills.months().get(place);
            return month.charged().total().stream()
                    .flatMap(total -> Digits.swapped(total.setScale(Math.max(2, total.scale()))).stream()
                            .filter(other -> closes(bills, place, other))
                            .map(other -> bills.read(
                                    this,
                                    "a total of " + Digits.shown(other) + " for " + Digits.shown(total)
                                            + " (digits swapped)",
                                    Map.of(
                                            place,
                                            month.withCharged(new Charged(
                                                    Optional.of(other),
                                                    month.charged().lines()))))));
        });
    }

    /** The statement stays as it is, so that the total can be held against it before anything is billed. */
    private static boolean closes(Case bills, int place, BigDecimal total) {
        ReconciledMonth month = bills.charged().get(place);
        return month != null
                && Verdict.of(total.subtract(month.recomputed()), month.slack().total())
                        .isAgreement();
    }
}
