// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import tariff.bill.Billing;
import tariff.json.JsonObject;
import tariff.json.ReviewJson;
import tariff.meter.MeteredSite;
import tariff.proposal.ClaimReview;
import tariff.proposal.Offer;
import tariff.rate.Rate;
import tariff.service.request.Request;
import tariff.service.shelf.Shelf;

/** Does this offer hold what it promises? */
record Reviews(Shelf shelf) implements Question {

    @Override
    public JsonObject answer(@Nullable Object document) {
        Request request = new Request(document);
        Optional<Rate> rate = request.rate(shelf);
        Optional<MeteredSite> bills = request.bills();
        Optional<Offer> offer = request.offer();
        request.refuseIfWrong();
        Billing billing = new Billing(rate.orElseThrow(), bills.orElseThrow().site());
        return ReviewJson.write(ClaimReview.of(billing, bills.orElseThrow().months(), offer.orElseThrow()));
    }
}
