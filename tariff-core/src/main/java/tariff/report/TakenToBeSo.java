// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import tariff.notice.Assumption;

/** Every assumption with the places it was used in; those of the same words are one row. */
final class TakenToBeSo implements Section {
    private record Kind(String message, String remedy) {}

    @Override
    public String id() {
        return "assumptions";
    }

    @Override
    public String title() {
        return "What was taken to be so";
    }

    @Override
    public void write(Html page, Report report) {
        Map<Kind, Set<String>> places = new LinkedHashMap<>();
        for (Assumption each : report.assessment().assumptions()) {
            places.computeIfAbsent(new Kind(each.message(), each.remedy()), kind -> new LinkedHashSet<>())
                    .add(each.where());
        }
        if (places.isEmpty()) {
            page.paragraph("Nothing: the data say everything that the rate asks.");
            return;
        }
        Table table = new Table(
                "assumptions-table",
                "What the data do not say, and what would remove the doubt",
                List.of("Taken to be so", "Where", "What would remove it"));
        places.forEach((kind, where) -> table.row(kind.message(), String.join(", ", where), kind.remedy()));
        table.write(page);
    }
}
