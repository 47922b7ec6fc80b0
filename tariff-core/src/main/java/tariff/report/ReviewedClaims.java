// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import java.util.List;
import tariff.proposal.Reviewed;
import tariff.proposal.Slip;
import tariff.proposal.Verdict;

/** What an offer claims, held against the rate, the bills and what physics allows. */
final class ReviewedClaims implements Section {
    @Override
    public String id() {
        return "claims";
    }

    @Override
    public String title() {
        return "What the offer claims";
    }

    @Override
    public void write(Html page, Report report) {
        if (report.claims().isEmpty()) {
            page.paragraph("No claims of an offer were given to review.");
            return;
        }
        Table table = new Table(
                "claims-table",
                "Each claim held against the rate, the bills and what physics allows",
                List.of("Claim", "Verdict", "Why", "Ways of claiming too much that were recognised"));
        for (Reviewed each : report.claims()) {
            table.row(
                    each.claim().words(),
                    word(each.verdict()),
                    each.verdict().words(),
                    String.join("; ", each.slips().stream().map(Slip::words).toList()));
        }
        table.withoutEmptyColumns().write(page);
        Table working = new Table(
                "claims-working", "The figures that the verdicts rest on", List.of("Claim", "Figure", "As shown"));
        report.claims()
                .forEach(each -> each.working()
                        .forEach(figure -> working.row(each.claim().words(), figure.what(), figure.figure())));
        if (!working.isEmpty()) {
            working.write(page);
        }
    }

    private static String word(Verdict verdict) {
        if (verdict instanceof Verdict.Holds) {
            return "holds";
        }
        if (verdict instanceof Verdict.HoldsOnlyIf) {
            return "holds only if";
        }
        if (verdict instanceof Verdict.BeyondRate) {
            return "beyond what the rate gives";
        }
        if (verdict instanceof Verdict.BeyondPhysics) {
            return "beyond what physics allows";
        }
        return "cannot be told";
    }
}
