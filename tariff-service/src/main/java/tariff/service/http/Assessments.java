// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import tariff.bill.Billing;
import tariff.json.AssessmentJson;
import tariff.json.JsonObject;
import tariff.meter.MeteredSite;
import tariff.proposal.Assessment;
import tariff.proposal.Proposal;
import tariff.rate.Rate;
import tariff.service.request.Request;
import tariff.service.shelf.Shelf;

/** What would this bank save, and when does it pay back? */
record Assessments(Shelf shelf) implements Question {

    @Override
    public JsonObject answer(@Nullable Object document) {
        Request request = new Request(document);
        Optional<Rate> rate = request.rate(shelf);
        Optional<MeteredSite> bills = request.bills();
        Optional<Proposal> proposal = request.proposal();
        request.refuseIfWrong();
        Billing billing = new Billing(rate.orElseThrow(), bills.orElseThrow().site());
        return AssessmentJson.write(Assessment.of(billing, bills.orElseThrow().months(), proposal.orElseThrow()));
    }
}
