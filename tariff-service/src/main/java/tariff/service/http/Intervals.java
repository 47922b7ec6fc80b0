// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tariff.bill.Billing;
import tariff.bill.ByTheTotals;
import tariff.bill.Statement;
import tariff.intervalfile.IntervalReading;
import tariff.json.AssessmentJson;
import tariff.json.JsonObject;
import tariff.json.NoticeJson;
import tariff.json.StatementsJson;
import tariff.meter.MonthlySums;
import tariff.meter.Site;
import tariff.notice.Assumption;
import tariff.proposal.Assessment;
import tariff.proposal.ClauseEffects;
import tariff.proposal.Proposal;
import tariff.proposal.SavingsBySize;
import tariff.rate.Rate;
import tariff.service.request.ClauseTerms;
import tariff.service.request.IntervalRequest;
import tariff.service.request.IntervalTerms;
import tariff.service.shelf.Shelf;

/** The same questions as of bills, asked of uploaded interval data. */
record Intervals(Shelf shelf) {

    JsonObject statements(IntervalRequest request, Uploads.Data data) {
        Optional<Rate> rate = request.rate(shelf);
        Site site = request.site();
        IntervalTerms terms = request.intervals();
        request.refuseIfWrong();
        IntervalReading read = data.read(terms.file());
        MonthlySums sums = terms.sums(read.series(), rate.orElseThrow());
        Billing billing = new Billing(rate.orElseThrow(), site);
        List<Statement> statements = billing.statements(sums.months());
        List<Assumption> assumptions = new ArrayList<>(read.assumptions());
        ByTheTotals.note(billing, statements).ifPresent(assumptions::add);
        JsonObject answer =
                StatementsJson.write(billing.rate(), statements).withAll("assumptions", assumptions, NoticeJson::write);
        return warned(answer, read);
    }

    JsonObject assessment(IntervalRequest request, Uploads.Data data) {
        Optional<Rate> rate = request.rate(shelf);
        Site site = request.site();
        IntervalTerms terms = request.intervals();
        Optional<Proposal> proposal = request.proposal();
        request.refuseIfWrong();
        IntervalReading read = data.read(terms.file());
        MonthlySums sums = terms.sums(read.series(), rate.orElseThrow());
        Billing billing = new Billing(rate.orElseThrow(), site);
        Assessment assessment = Assessment.of(billing, sums, proposal.orElseThrow());
        return warned(AssessmentJson.write(assessment.with(read.assumptions())), read);
    }

    JsonObject clauseEffects(IntervalRequest request, Uploads.Data data) {
        Optional<Rate> rate = request.rate(shelf);
        Site site = request.site();
        IntervalTerms terms = request.intervals();
        Optional<ClauseTerms> asked = request.clauses();
        request.refuseIfWrong();
        IntervalReading read = data.read(terms.file());
        MonthlySums sums = terms.sums(read.series(), rate.orElseThrow());
        Billing billing = new Billing(rate.orElseThrow(), site);
        ClauseEffects effects =
                ClauseEffects.of(billing, sums, asked.orElseThrow().kvar()).with(read.assumptions());
        return warned(
                Clauses.write(
                        effects, asked.orElseThrow(), () -> SavingsBySize.of(billing, sums, SavingsBySize.USUAL_STEPS)),
                read);
    }

    private static JsonObject warned(JsonObject answer, IntervalReading read) {
        return answer.withAll("warnings", read.warnings(), NoticeJson::write);
    }
}
