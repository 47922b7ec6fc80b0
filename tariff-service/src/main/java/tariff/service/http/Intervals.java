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
        Upload upload = upload(request, data);
        List<Statement> statements = upload.billing().statements(upload.sums().months());
        List<Assumption> assumptions = new ArrayList<>(upload.assumptions());
        ByTheTotals.note(upload.billing(), statements).ifPresent(assumptions::add);
        return upload.warned(StatementsJson.write(upload.billing().rate(), statements)
                .withAll("assumptions", assumptions, NoticeJson::write));
    }

    JsonObject assessment(IntervalRequest request, Uploads.Data data) {
        Optional<Proposal> proposal = request.proposal();
        Upload upload = upload(request, data);
        Assessment assessment = Assessment.of(upload.billing(), upload.sums(), proposal.orElseThrow());
        return upload.warned(AssessmentJson.write(assessment.with(upload.assumptions())));
    }

    JsonObject clauseEffects(IntervalRequest request, Uploads.Data data) {
        Optional<ClauseTerms> asked = request.clauses();
        Upload upload = upload(request, data);
        ClauseEffects effects = ClauseEffects.of(
                upload.billing(), upload.sums(), asked.orElseThrow().kvar());
        return upload.warned(Clauses.write(
                effects.with(upload.assumptions()),
                asked.orElseThrow(),
                () -> SavingsBySize.of(upload.billing(), upload.sums(), SavingsBySize.USUAL_STEPS)));
    }

    /** Reads the data once nothing is wrong with what is said beside them. */
    private Upload upload(IntervalRequest request, Uploads.Data data) {
        Optional<Rate> rate = request.rate(shelf);
        Site site = request.site();
        IntervalTerms terms = request.intervals();
        request.refuseIfWrong();
        IntervalReading read = data.read(terms.file());
        MonthlySums sums = terms.sums(read.series(), rate.orElseThrow());
        return new Upload(new Billing(rate.orElseThrow(), site), sums, read);
    }

    private record Upload(Billing billing, MonthlySums sums, IntervalReading read) {
        List<Assumption> assumptions() {
            return read.assumptions(sums);
        }

        JsonObject warned(JsonObject answer) {
            return answer.withAll("warnings", read.warnings(), NoticeJson::write);
        }
    }
}
