// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.FieldMismatchStrategy;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import tariff.notice.Finding;
import tariff.notice.Refusal;

/**
 * Which separator a file uses: the one that lets the most headings be read.
 *
 * @param separator its name, such as {@code semicolon}
 */
record Layout(String separator, Header header) {
    private static final Pattern SEPARATOR_LINE = Pattern.compile("\\A\"?sep=([,;|\\t])\"?\\s*?\\r?\\n");
    private static final int MOST_ROWS = 5_000;
    private static final int MOST_COLUMNS = 500;
    private static final List<Separator> SEPARATORS = List.of(
            new Separator('\t', "tab"),
            new Separator(';', "semicolon"),
            new Separator('|', "pipe"),
            new Separator(',', "comma"));

    private record Separator(char mark, String name) {}

    static Layout of(String text, HeadingReader reader) {
        Matcher told = SEPARATOR_LINE.matcher(text);
        boolean isTold = told.find();
        String body = isTold ? text.substring(told.end()) : text;
        Optional<Layout> best = Optional.empty();
        for (Separator separator : SEPARATORS) {
            if (!isTold || told.group(1).charAt(0) == separator.mark) {
                Optional<Layout> layout = split(body, separator.mark)
                        .flatMap(sheet -> Header.find(sheet, reader))
                        .map(header -> new Layout(separator.name, header));
                if (layout.map(Layout::score).orElse(0)
                        > best.map(Layout::score).orElse(0)) {
                    best = layout;
                }
            }
        }
        if (best.isEmpty()
                && SEPARATORS.stream().allMatch(each -> split(body, each.mark).isEmpty())) {
            throw new Refusal(Finding.error(
                            "quotes", "", "a quotation mark opens a cell and does not close it, or text follows it")
                    .allowed("quotation marks around whole cells, doubled inside them"));
        }
        return best.orElseThrow(() -> new Refusal(Finding.error(
                        "no-header",
                        "",
                        "no row names both the month and a figure, in commas, semicolons, tabs or pipes")
                .found(firstLine(body))
                .allowed("a row of names such as: Month, kWh, Lagging kvarh, Peak kW")));
    }

    private int score() {
        return header.score();
    }

    private static Optional<Sheet> split(String text, char separator) {
        List<List<String>> rows = new ArrayList<>();
        try {
            var records = CsvReader.builder()
                    .fieldSeparator(separator)
                    .skipEmptyLines(false)
                    .extraFieldStrategy(FieldMismatchStrategy.IGNORE)
                    .missingFieldStrategy(FieldMismatchStrategy.IGNORE)
                    .ofCsvRecord(text);
            for (var row : records) {
                rows.add(row.getFields().stream().map(Layout::trim).toList());
                if (rows.size() > MOST_ROWS) {
                    throw refuseSize("rows", MOST_ROWS);
                }
                if (row.getFieldCount() > MOST_COLUMNS) {
                    throw refuseSize("columns", MOST_COLUMNS);
                }
            }
        } catch (CsvParseException unreadable) {
            return Optional.empty();
        }
        return Optional.of(Sheet.of(rows));
    }

    private static Refusal refuseSize(String what, int most) {
        return new Refusal(
                Finding.error("table-too-large", "", "the file has more " + what + " than a bills file can have")
                        .allowed("at most " + most + " " + what));
    }

    private static String trim(String cell) {
        return cell.replace('\u00a0', ' ')
                .replace('\u202f', ' ')
                .replace('\u2009', ' ')
                .replace('\u2007', ' ')
                .strip();
    }

    private static String firstLine(String text) {
        String line = text.lines()
                .filter(each -> !each.isBlank())
                .findFirst()
                .orElse("nothing")
                .strip();
        return line.length() > 80 ? line.substring(0, 80) + "…" : line;
    }
}
