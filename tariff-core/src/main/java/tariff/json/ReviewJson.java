// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import java.util.Locale;
import tariff.proposal.ClaimReview;
import tariff.proposal.Reviewed;
import tariff.proposal.Slip;

/** An offer, claim by claim, and the assessment of its bank. */
public final class ReviewJson {
    private ReviewJson() {}

    public static JsonObject write(ClaimReview review) {
        return new JsonObject()
                .withAll("claims", review.claims(), ReviewJson::write)
                .with("assessment", AssessmentJson.write(review.assessment()));
    }

    private static JsonObject write(Reviewed claim) {
        return new JsonObject()
                .with("claim", claim.claim().words())
                .with("verdict", claim.verdict().kind())
                .withIf("limit", claim.verdict().limit())
                .with("words", claim.verdict().words())
                .withAll("working", claim.working(), ReviewJson::write)
                .withAll("slips", claim.slips(), ReviewJson::write);
    }

    private static JsonObject write(Reviewed.Working working) {
        return new JsonObject().with("what", working.what()).with("figure", working.figure());
    }

    private static JsonObject write(Slip slip) {
        return new JsonObject()
                .with("code", slip.name().toLowerCase(Locale.ROOT).replace('_', '-'))
                .with("words", slip.words());
    }
}
