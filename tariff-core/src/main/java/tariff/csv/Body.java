// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tariff.notice.Finding;

/**
 * The lines under a header, sorted into those that bill a period and those that do not.
 *
 * @param months lines that bill a period
 * @param totals lines that add up or average others
 * @param skipped why a line was left out, one sentence each
 */
record Body(List<BilledLine> months, List<Integer> totals, List<String> skipped, List<Finding> findings) {

    /** A line and the days that its cells give. */
    record BilledLine(int line, PeriodText period, String written) {}

    static Body of(Header header) {
        Body body = new Body(new ArrayList<>(), new ArrayList<>(), new ArrayList<>(), new ArrayList<>());
        Sheet sheet = header.sheet();
        for (int line = 0; line < header.line(); line++) {
            if (!isBlank(sheet, line)) {
                body.skip(sheet, line, "it stands above the names");
            }
        }
        PeriodCells periods = new PeriodCells(header);
        for (int line = header.firstBodyLine(); line < sheet.lines(); line++) {
            if (!isBlank(sheet, line)) {
                body.sort(header, periods, line);
            }
        }
        if (body.months.isEmpty() && body.findings.isEmpty()) {
            body.findings.add(Finding.error(
                    "no-months",
                    sheet.linePlace(header.line()),
                    "names the columns, but no month with figures follows"));
        }
        return body;
    }

    private void sort(Header header, PeriodCells periods, int line) {
        Sheet sheet = header.sheet();
        String first = sheet.line(line).stream()
                .filter(cell -> !cell.isEmpty())
                .findFirst()
                .orElse("");
        String written = periods.written(line);
        boolean figures = hasFigures(header, line);
        if (first.startsWith("#") && first.length() > 1 && !first.startsWith("#N")) {
            skip(sheet, line, "it is a comment");
        } else if (sheet.line(line).equals(sheet.line(header.line()))) {
            skip(sheet, line, "it repeats the names");
        } else if (TotalsWords.begin(first)
                || TotalsWords.begin(written)
                || (!periods.hasYear() && TotalsWords.isBareYear(written))) {
            totals.add(line);
            skip(sheet, line, "it is a total or an average (" + first + ")");
        } else if (!figures) {
            skip(sheet, line, "it has no figures");
        } else if (written.isEmpty()) {
            findings.add(Finding.error("no-month", sheet.linePlace(line), "has figures but no month")
                    .allowed("a month in each row; a word such as Total before a row of totals"));
        } else {
            Optional<PeriodText> period = periods.read(line, findings);
            period.ifPresent(text -> months.add(new BilledLine(line, text, written)));
        }
    }

    private void skip(Sheet sheet, int line, String why) {
        String place = sheet.linePlace(line);
        skipped.add(Character.toUpperCase(place.charAt(0)) + place.substring(1) + ": left out, " + why);
    }

    private static boolean isBlank(Sheet sheet, int line) {
        return sheet.line(line).stream().allMatch(String::isEmpty);
    }

    private static boolean hasFigures(Header header, int line) {
        for (int column = 0; column < header.headings().size(); column++) {
            if (header.headings().get(column).meaning().isNumber()
                    && !NumberCell.isAbsent(header.sheet().cell(line, column))) {
                return true;
            }
        }
        return false;
    }
}
