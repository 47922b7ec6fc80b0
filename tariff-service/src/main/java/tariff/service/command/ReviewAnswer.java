// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.math.BigDecimal;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import tariff.json.JsonObject;
import tariff.json.ReviewJson;
import tariff.proposal.ClaimReview;
import tariff.proposal.Reviewed;
import tariff.proposal.Slip;

/** A reviewed offer, printed: the claims first, then the assessment that they were held against. */
record ReviewAnswer(ClaimReview review) implements Format.Printable {

    @Override
    public String text() {
        StringBuilder out = new StringBuilder("What the offer promises\n");
        for (Reviewed claim : review.claims()) {
            out.append('\n').append(Wrapped.text("The offer " + said(claim)));
            out.append(Wrapped.text("  " + capital(claim.verdict().words()) + "."));
            claim.slips().forEach(slip -> out.append(Wrapped.text("  Slip: " + slip.words() + ".")));
            claim.working().forEach(each -> out.append(Wrapped.text("    " + each.what() + ": " + each.figure())));
        }
        return out.append("\nWhat it was held against\n\n")
                .append(new AssessmentAnswer(review.assessment()).text())
                .toString();
    }

    /** A claim speaks of the bank; one that nobody wrote down is made by every plain bank. */
    private static String said(Reviewed claim) {
        return "says that the bank " + claim.claim().words();
    }

    private static String capital(String words) {
        return words.substring(0, 1).toUpperCase(Locale.ROOT) + words.substring(1);
    }

    @Override
    public JsonObject json() {
        return ReviewJson.write(review);
    }

    @Override
    public String csv() {
        Csv csv = new Csv(List.of("claim", "verdict", "limit", "words", "slips", "working"));
        review.claims()
                .forEach(claim -> csv.row(List.of(
                        claim.claim().words(),
                        claim.verdict().kind(),
                        claim.verdict().limit().map(BigDecimal::toPlainString).orElse(""),
                        claim.verdict().words(),
                        claim.slips().stream().map(Slip::words).collect(Collectors.joining("; ")),
                        claim.working().stream()
                                .map(each -> each.what() + ": " + each.figure())
                                .collect(Collectors.joining("; ")))));
        return csv.text();
    }
}
