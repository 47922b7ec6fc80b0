// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.util.ArrayList;
import java.util.List;

/** A text table: the first column to the left, amounts to the right. */
final class Table {
    private static final String GAP = "  ";

    private final List<List<String>> rows = new ArrayList<>();

    Table row(String... cells) {
        rows.add(List.of(cells));
        return this;
    }

    /** Rows of different lengths may stand under each other. */
    String text() {
        StringBuilder out = new StringBuilder();
        for (List<String> row : rows) {
            StringBuilder line = new StringBuilder();
            for (int i = 0; i < row.size(); i++) {
                String pad = " ".repeat(width(i) - length(row.get(i)));
                line.append(i == 0 ? row.get(i) + pad : GAP + pad + row.get(i));
            }
            out.append(line.toString().stripTrailing()).append('\n');
        }
        return out.toString();
    }

    private int width(int column) {
        return rows.stream()
                .filter(row -> row.size() > column)
                .mapToInt(row -> length(row.get(column)))
                .max()
                .orElse(0);
    }

    private static int length(String cell) {
        return cell.codePointCount(0, cell.length());
    }
}
