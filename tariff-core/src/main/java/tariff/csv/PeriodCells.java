// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import tariff.notice.Finding;

/** The cells of a line that say which days were billed: From and To if there are both, else the month, with its year if that stands apart. */
final class PeriodCells {
    private static final String ALLOWED = "a month such as 2026-01 or Jan 2026, or a day such as 2026-01-31";
    private final Header header;
    private final Optional<Integer> month;
    private final Optional<Integer> year;
    private final List<Integer> fromAndTo;

    PeriodCells(Header header) {
        this.header = header;
        Optional<Integer> from = Columns.date(header, Meaning.When.FROM);
        Optional<Integer> to = Columns.date(header, Meaning.When.TO);
        fromAndTo = from.isPresent() && to.isPresent() ? List.of(from.get(), to.get()) : List.of();
        month = Columns.date(header, Meaning.When.MONTH);
        year = Columns.date(header, Meaning.When.YEAR);
    }

    boolean hasYear() {
        return year.isPresent();
    }

    /** Everything that stands in those cells. */
    String written(int line) {
        Stream<String> cells = fromAndTo.isEmpty()
                ? month.stream().map(column -> cell(line, column))
                : fromAndTo.stream().map(column -> cell(line, column));
        return String.join(
                " – ", cells.filter(cell -> !NumberCell.isAbsent(cell)).toList());
    }

    /** Empty if a cell is no date, with a finding for each such cell. */
    Optional<PeriodText> read(int line, List<Finding> findings) {
        if (fromAndTo.isEmpty()) {
            int column = month.orElse(0);
            PeriodText text = withYear(line, column);
            if (!text.isDate()) {
                findings.add(refuse(line, column));
            }
            return text.isDate() ? Optional.of(text) : Optional.empty();
        }
        List<DateCell> cells = fromAndTo.stream()
                .map(column -> DateCell.of(cell(line, column)))
                .toList();
        for (int i = 0; i < 2; i++) {
            if (cells.get(i).isNothing()) {
                findings.add(refuse(line, fromAndTo.get(i)));
            }
        }
        return cells.stream().anyMatch(DateCell::isNothing) ? Optional.empty() : Optional.of(new PeriodText(cells));
    }

    private PeriodText withYear(int line, int column) {
        String text = cell(line, column);
        PeriodText alone = PeriodText.of(text);
        if (alone.isDate() || year.isEmpty()) {
            return alone;
        }
        String yearText = cell(line, year.get());
        return PeriodText.of(text.matches("\\d{1,2}") ? text + "/" + yearText : text + " " + yearText);
    }

    private Finding refuse(int line, int column) {
        return refuse(header, line, column);
    }

    /** Says what is wrong with a cell that is no date. */
    static Finding refuse(Header header, int line, int column) {
        String text = header.sheet().cell(line, column);
        Finding finding = text.matches("[3-6]\\d{4}([.,]\\d+)?")
                ? Finding.error(
                        "day-number",
                        header.place(line, column),
                        "looks like a spreadsheet's number for a day; give the column a date format and export again")
                : Finding.error("not-a-date", header.place(line, column), "is not a date");
        return finding.found(text.isEmpty() ? "nothing" : shortened(text)).allowed(ALLOWED);
    }

    static String shortened(String text) {
        String line = text.replaceAll("\\s+", " ");
        return line.length() > 40 ? line.substring(0, 40) + "…" : line;
    }

    private String cell(int line, int column) {
        return header.sheet().cell(line, column);
    }
}
