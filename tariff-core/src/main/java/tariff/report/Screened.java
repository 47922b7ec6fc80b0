// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import java.util.List;
import tariff.electrical.Screening;
import tariff.electrical.Verdict;

/** What electrical screening makes of the bank at the site. */
final class Screened implements Section {
    @Override
    public String id() {
        return "screens";
    }

    @Override
    public String title() {
        return "Electrical screening";
    }

    @Override
    public void write(Html page, Report report) {
        if (report.screens().isEmpty()) {
            page.paragraph(
                    "Nothing was screened: no data of the site are given, such as transformer, voltage, harmonics and motors. That"
                            + " says nothing, least of all that all is well.");
            return;
        }
        page.paragraph(
                "Screening shows where to look; it is never a design. \"Not screened\" says nothing, least of all that all is well.");
        Table table = new Table(
                "screens-table",
                "Questions that every bank must answer",
                List.of("Question", "Verdict", "Found", "Held against", "Source", "What would settle it"));
        for (Verdict verdict : List.of(Verdict.STOP, Verdict.LOOK_CLOSER, Verdict.FINE, Verdict.NOT_SCREENED)) {
            for (Screening each : report.screens()) {
                if (each.verdict() == verdict) {
                    table.row(
                            each.name(),
                            Shown.word(verdict),
                            each.found(),
                            each.limit(),
                            each.source(),
                            each.settledBy());
                }
            }
        }
        table.write(page);
    }
}
