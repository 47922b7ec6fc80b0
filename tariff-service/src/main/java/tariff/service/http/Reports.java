// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import java.nio.charset.StandardCharsets;
import java.time.LocalDate;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import tariff.bill.Billing;
import tariff.meter.MeteredSite;
import tariff.proposal.Assessment;
import tariff.proposal.Proposal;
import tariff.proposal.SavingsBySize;
import tariff.rate.Rate;
import tariff.report.Report;
import tariff.service.request.Request;
import tariff.service.shelf.Shelf;

/** What can be handed over of an assessment? The answer is a page, so a client saves it as it comes. */
record Reports(Shelf shelf) {
    static final String TYPE = "text/html";

    byte[] page(@Nullable Object document) {
        Request request = new Request(document);
        Optional<Rate> rate = request.rate(shelf);
        Optional<MeteredSite> bills = request.bills();
        Optional<Proposal> proposal = request.proposal();
        Optional<LocalDate> date = request.date();
        request.refuseIfWrong();
        Billing billing = new Billing(rate.orElseThrow(), bills.orElseThrow().site());
        Report report = Report.of(Assessment.of(billing, bills.orElseThrow().months(), proposal.orElseThrow()))
                .withSizes(SavingsBySize.of(billing, bills.orElseThrow().months(), SavingsBySize.USUAL_STEPS));
        return date.map(report::dated).orElse(report).html().getBytes(StandardCharsets.UTF_8);
    }
}
