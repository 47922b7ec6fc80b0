// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.util.ArrayList;
import java.util.List;
import tariff.reconcile.Verdict;

/** What was charged beside what was worked out, with the verdict in words at the end of each row. */
final class Verdicts {
    private final Table table;
    private final List<String> words = new ArrayList<>(List.of(""));

    Verdicts(String heading) {
        table = new Table().row(heading, "Billed", "Recomputed", "Difference");
    }

    void row(String name, String charged, String recomputed, String difference, Verdict verdict) {
        table.row(name, charged, recomputed, difference);
        words.add("  " + verdict.words());
    }

    String text() {
        List<String> rows = table.text().lines().toList();
        StringBuilder out = new StringBuilder();
        for (int i = 0; i < rows.size(); i++) {
            out.append((rows.get(i) + words.get(i)).stripTrailing()).append('\n');
        }
        return out.toString();
    }
}
