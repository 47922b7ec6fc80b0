// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import tariff.bill.Billing;
import tariff.json.JsonObject;
import tariff.json.StatementsJson;
import tariff.meter.MeteredSite;
import tariff.rate.Rate;
import tariff.service.request.Request;
import tariff.service.shelf.Shelf;

/** What does a rate ask for these months? */
record Statements(Shelf shelf) implements Question {

    @Override
    public JsonObject answer(@Nullable Object document) {
        Request request = new Request(document);
        Optional<Rate> rate = request.rate(shelf);
        Optional<MeteredSite> bills = request.bills();
        request.refuseIfWrong();
        Billing billing = new Billing(rate.orElseThrow(), bills.orElseThrow().site());
        return StatementsJson.write(
                billing.rate(), billing.statements(bills.orElseThrow().months()));
    }
}
