// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import tariff.bill.Billing;
import tariff.json.JsonObject;
import tariff.json.ReconciliationJson;
import tariff.meter.MeteredSite;
import tariff.rate.Rate;
import tariff.reconcile.Reconciliation;
import tariff.service.request.Request;
import tariff.service.shelf.Shelf;

/** Do the bills that were paid agree with the rate, and if not, what would make them agree? */
record Reconciliations(Shelf shelf) implements Question {

    @Override
    public JsonObject answer(@Nullable Object document) {
        Request request = new Request(document);
        Optional<Rate> rate = request.rate(shelf);
        Optional<MeteredSite> bills = request.bills();
        request.refuseIfWrong();
        Billing billing = new Billing(rate.orElseThrow(), bills.orElseThrow().site());
        return ReconciliationJson.write(
                billing.rate(), Reconciliation.of(billing, bills.orElseThrow().months()));
    }
}
