// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import de.siegmar.fastcsv.writer.CsvWriter;
import de.siegmar.fastcsv.writer.LineDelimiter;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/**
 * A table to paste into a spreadsheet: commas, decimal points, UTF-8, quotes only where needed. A text that a spreadsheet would
 * run as a formula gets an apostrophe in front (OWASP, CSV Injection).
 *
 * @param names the first row
 * @param rows the rows below it
 */
public record CsvTable(List<String> names, List<List<String>> rows) {
    private static final String FORMULA_STARTS = "=+-@\t\r\n";

    public CsvTable {
        names = List.copyOf(names);
        rows = rows.stream().map(List::copyOf).toList();
    }

    public static CsvTable of(String... names) {
        return new CsvTable(List.of(names), List.of());
    }

    /** With one row more; a number is written plainly, anything else as text. */
    public CsvTable row(Object... cells) {
        List<List<String>> more = new ArrayList<>(rows);
        more.add(List.of(cells).stream().map(CsvTable::cell).toList());
        return new CsvTable(names, more);
    }

    /** The table as text, lines ended by CR LF (RFC 4180, 2.1). */
    public String text() {
        StringWriter out = new StringWriter();
        try (CsvWriter csv =
                CsvWriter.builder().lineDelimiter(LineDelimiter.CRLF).build(out)) {
            csv.writeRecord(names.stream().map(CsvTable::guarded).toList());
            rows.forEach(csv::writeRecord);
        } catch (IOException impossible) {
            throw new UncheckedIOException(impossible);
        }
        return out.toString();
    }

    public byte[] bytes() {
        return text().getBytes(StandardCharsets.UTF_8);
    }

    private static String cell(Object value) {
        if (value instanceof BigDecimal number) {
            return number.toPlainString();
        }
        return value instanceof Integer || value instanceof Long ? value.toString() : guarded(value.toString());
    }

    private static String guarded(String text) {
        return !text.isEmpty() && FORMULA_STARTS.indexOf(text.charAt(0)) >= 0 ? "'" + text : text;
    }
}
