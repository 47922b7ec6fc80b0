// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import tariff.meter.Charged;
import tariff.meter.MeteredMonth;
import tariff.meter.Readings;
import tariff.notice.Finding;

/** One line of the sheet as a metered month, with a finding for each cell that cannot be read. */
record MonthReader(Header header, DateOrder order, NumberReading numbers, List<Finding> findings) {
    private static final Set<String> YES = Set.of(
            "yes",
            "y",
            "x",
            "true",
            "1",
            "e",
            "est",
            "estimated",
            "ja",
            "j",
            "oui",
            "o",
            "si",
            "s",
            "sim",
            "geschatzt",
            "estime",
            "estimee",
            "estimada",
            "estimado",
            "stimata",
            "stimato");
    private static final Set<String> NO = Set.of(
            "", "no", "n", "false", "0", "a", "act", "actual", "read", "nein", "non", "nao", "reel", "reelle", "real");

    MeteredMonth read(PeriodReading.Billed billed) {
        Readings totals = Readings.none();
        Map<String, Readings> windows = new TreeMap<>();
        Optional<BigDecimal> total = Optional.empty();
        Map<String, BigDecimal> lines = new LinkedHashMap<>();
        Optional<LocalDate> statement = Optional.empty();
        boolean estimated = false;
        for (int column = 0; column < header.headings().size(); column++) {
            Cell cell = new Cell(header, billed.line(), column);
            Meaning meaning = cell.heading().meaning();
            if (meaning instanceof Meaning.Reading reading) {
                Readings before = reading.window()
                        .map(name -> windows.getOrDefault(name, Readings.none()))
                        .orElse(totals);
                Readings after = FigureReader.read(cell, numbers, findings)
                        .map(value -> before.with(reading.register(), value))
                        .orElse(before);
                if (reading.window().isEmpty()) {
                    totals = after;
                } else if (!after.values().isEmpty()) {
                    windows.put(reading.window().get(), after);
                }
            } else if (meaning instanceof Meaning.Total) {
                total = FigureReader.amount(cell, numbers, findings);
            } else if (meaning instanceof Meaning.Line line) {
                FigureReader.amount(cell, numbers, findings).ifPresent(amount -> lines.put(line.name(), amount));
            } else if (meaning.equals(new Meaning.Date(Meaning.When.STATEMENT))) {
                statement = statement(cell);
            } else if (meaning instanceof Meaning.Estimated) {
                estimated = estimated(cell);
            }
        }
        return new MeteredMonth(billed.period(), totals, windows, new Charged(total, lines), statement, estimated);
    }

    /** One cell with its heading. */
    record Cell(Header header, int line, int column) {
        Heading heading() {
            return header.headings().get(column);
        }

        String text() {
            return header.sheet().cell(line, column);
        }

        Finding error(String code, String message) {
            return Finding.error(code, header.place(line, column), message).found(PeriodCells.shortened(text()));
        }
    }

    private Optional<LocalDate> statement(Cell cell) {
        if (NumberCell.isAbsent(cell.text())) {
            return Optional.empty();
        }
        Optional<LocalDate> day = DateCell.of(cell.text()).day(order);
        if (day.isEmpty()) {
            findings.add(PeriodCells.refuse(header, cell.line(), cell.column()));
        }
        return day;
    }

    private boolean estimated(Cell cell) {
        String word = NumberCell.isAbsent(cell.text()) ? "" : Words.plain(cell.text());
        if (!YES.contains(word) && !NO.contains(word)) {
            findings.add(cell.error("not-yes-or-no", "does not say whether a reading was estimated")
                    .allowed("yes or no"));
        }
        return YES.contains(word);
    }
}
