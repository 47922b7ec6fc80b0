// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.util.List;
import java.util.stream.Collectors;

/** Comma-separated values, RFC 4180. A text that a spreadsheet would take for a formula is kept a text by a leading apostrophe. */
final class Csv {
    private final StringBuilder text = new StringBuilder();

    Csv(List<String> header) {
        row(header);
    }

    void row(List<String> cells) {
        text.append(cells.stream().map(Csv::cell).collect(Collectors.joining(",")))
                .append("\r\n");
    }

    String text() {
        return text.toString();
    }

    private static String cell(String value) {
        boolean formula = value.matches("(?s)[=+@\\t\\r-].*") && !value.matches("-?[0-9.]+");
        String safe = formula ? "'" + value : value;
        return safe.matches("(?s).*[\",\\r\\n].*") ? '"' + safe.replace("\"", "\"\"") + '"' : safe;
    }
}
