// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import tariff.bill.Billing;
import tariff.json.JsonObject;
import tariff.json.SizingJson;
import tariff.meter.MeteredMonth;
import tariff.meter.MeteredSite;
import tariff.proposal.Sizing;
import tariff.rate.Rate;
import tariff.service.request.Request;
import tariff.service.request.SizeTerms;
import tariff.service.shelf.Shelf;

/** Which bank is best, if any? */
record Sizings(Shelf shelf) implements Question {

    @Override
    public JsonObject answer(@Nullable Object document) {
        Request request = new Request(document);
        Optional<Rate> rate = request.rate(shelf);
        Optional<MeteredSite> bills = request.bills();
        Optional<SizeTerms> terms = request.sizing();
        request.refuseIfWrong();
        Billing billing = new Billing(rate.orElseThrow(), bills.orElseThrow().site());
        List<MeteredMonth> months = bills.orElseThrow().months();
        return SizingJson.write(
                billing, Sizing.of(billing, months, terms.orElseThrow().on(months)));
    }
}
