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
import tariff.service.request.BankTerms;
import tariff.service.request.InvestmentTerms;
import tariff.service.request.OutlookTerms;
import tariff.service.request.Request;
import tariff.service.shelf.Shelf;

/** What would this bank save, and when does it pay back? */
record Assessments(Shelf shelf) implements Question {

    @Override
    public JsonObject answer(@Nullable Object document) {
        Request request = new Request(document);
        Optional<Rate> rate = request.rate(shelf);
        Optional<MeteredSite> bills = request.bills();
        Optional<BankTerms> bank = request.bank();
        Optional<InvestmentTerms> investment = request.investment();
        OutlookTerms outlook = request.outlook();
        request.refuseIfWrong();
        Proposal proposal =
                new Proposal(bank.orElseThrow().bank(), investment.map(InvestmentTerms::investment), outlook.outlook());
        Billing billing = new Billing(rate.orElseThrow(), bills.orElseThrow().site());
        return AssessmentJson.write(Assessment.of(billing, bills.orElseThrow().months(), proposal));
    }
}
