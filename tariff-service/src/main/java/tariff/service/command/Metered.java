// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.util.List;
import java.util.Optional;
import tariff.bill.Billing;
import tariff.meter.MeteredMonth;
import tariff.meter.MonthlySums;
import tariff.meter.Site;
import tariff.notice.Assumption;
import tariff.proposal.Assessment;
import tariff.proposal.ClaimReview;
import tariff.proposal.Offer;
import tariff.proposal.Proposal;
import tariff.proposal.SavingsBySize;
import tariff.rate.Rate;

/**
 * What a command was given to work on.
 *
 * @param rate the rate
 * @param site what the contract says
 * @param months by date
 * @param sums the intervals behind the months, if interval data were given
 * @param assumptions what reading the file took to be so
 */
record Metered(
        Rate rate, Site site, List<MeteredMonth> months, Optional<MonthlySums> sums, List<Assumption> assumptions) {

    Billing billing() {
        return new Billing(rate, site);
    }

    /** The proposal held against the intervals if there are any, else against the months. */
    Assessment assessment(Proposal proposal) {
        return sums.map(intervals -> Assessment.of(billing(), intervals, proposal))
                .orElseGet(() -> Assessment.of(billing(), months, proposal))
                .with(assumptions);
    }

    ClaimReview review(Offer offer) {
        ClaimReview review = sums.map(intervals -> ClaimReview.of(billing(), intervals, offer))
                .orElseGet(() -> ClaimReview.of(billing(), months, offer));
        return new ClaimReview(review.assessment().with(assumptions), review.claims());
    }

    SavingsBySize savingsBySize() {
        return sums.map(intervals -> SavingsBySize.of(billing(), intervals, SavingsBySize.USUAL_STEPS))
                .orElseGet(() -> SavingsBySize.of(billing(), months, SavingsBySize.USUAL_STEPS));
    }
}
