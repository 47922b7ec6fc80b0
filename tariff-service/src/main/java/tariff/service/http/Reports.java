// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import java.nio.charset.StandardCharsets;
import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import tariff.bill.Billing;
import tariff.meter.MeteredMonth;
import tariff.meter.MeteredSite;
import tariff.proposal.Assessment;
import tariff.proposal.ClaimReview;
import tariff.proposal.Offer;
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
        Optional<Offer> offer =
                request.claims() ? request.offer() : request.proposal().map(each -> Offer.of(each));
        Optional<LocalDate> date = request.date();
        request.refuseIfWrong();
        Billing billing = new Billing(rate.orElseThrow(), bills.orElseThrow().site());
        List<MeteredMonth> months = bills.orElseThrow().months();
        Report report = (request.claims()
                        ? Report.of(ClaimReview.of(billing, months, offer.orElseThrow()))
                        : Report.of(Assessment.of(
                                billing, months, offer.orElseThrow().proposal())))
                .withSizes(SavingsBySize.of(billing, months, SavingsBySize.USUAL_STEPS));
        return date.map(report::dated).orElse(report).html().getBytes(StandardCharsets.UTF_8);
    }
}
