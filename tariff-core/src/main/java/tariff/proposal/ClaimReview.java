// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.util.ArrayList;
import java.util.List;
import tariff.bill.Billing;
import tariff.meter.MeteredMonth;
import tariff.meter.MonthlySums;
import tariff.notice.Refusal;

/**
 * An offer held against the rate, the bills and what physics allows.
 *
 * @param assessment of the bank that is offered
 * @param claims each claim with its verdict, in the order of the offer; a plain bank also claims that it may be plain
 */
public record ClaimReview(Assessment assessment, List<Reviewed> claims) {
    public ClaimReview {
        claims = List.copyOf(claims);
    }

    /**
     * Reviews an offer on the last twelve of the months, or all if they are fewer.
     *
     * @param months in any order
     * @throws Refusal naming the months that overlap, or every month that lacks what the rate bills
     */
    public static ClaimReview of(Billing billing, List<MeteredMonth> months, Offer offer) {
        return of(Assessment.of(billing, months, offer.proposal()), offer);
    }

    /**
     * Reviews an offer on interval data, where nothing is left to bounds.
     *
     * @throws Refusal naming every month that lacks what the rate bills
     */
    public static ClaimReview of(Billing billing, MonthlySums sums, Offer offer) {
        return of(Assessment.of(billing, sums, offer.proposal()), offer);
    }

    private static ClaimReview of(Assessment assessment, Offer offer) {
        Evidence evidence = new Evidence(assessment, offer);
        List<Claim> claims = new ArrayList<>(offer.claims());
        if (offer.proposal().bank().reactorShare().signum() == 0
                && claims.stream().noneMatch(PlainBankClaim.class::isInstance)) {
            claims.add(new PlainBankClaim());
        }
        return new ClaimReview(
                assessment, claims.stream().map(claim -> claim.review(evidence)).toList());
    }
}
