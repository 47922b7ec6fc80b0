// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import tariff.meter.Period;
import tariff.notice.Finding;

/**
 * The order of day and month in a file: as chosen, as some cell proves, or as the only one in which the periods follow one
 * another.
 *
 * @param order the order to read in; if the file needs none or shows none, day first
 * @param why the sentence that says so, empty if no cell needs an order
 * @param question asked if cells need an order and nothing tells it
 */
record DateReading(DateOrder order, Optional<String> why, Optional<Finding> question) {

    private record Cell(DateCell cell, int line, int column) {}

    static DateReading judge(Header header, Body body, Optional<DateOrder> choice) {
        List<Cell> cells = cells(header, body);
        if (choice.isPresent()) {
            return new DateReading(
                    choice.get(), Optional.of("Dates: " + choice.get().word() + ", as chosen"), Optional.empty());
        }
        Optional<Cell> unclear =
                cells.stream().filter(cell -> cell.cell().isAmbiguous()).findFirst();
        Optional<Cell> dayFirst = proof(cells, DateOrder.DAY_FIRST);
        Optional<Cell> monthFirst = proof(cells, DateOrder.MONTH_FIRST);
        if (dayFirst.isPresent() != monthFirst.isPresent()) {
            Cell cell = dayFirst.or(() -> monthFirst).orElseThrow();
            DateOrder order = dayFirst.isPresent() ? DateOrder.DAY_FIRST : DateOrder.MONTH_FIRST;
            String why = "Dates: " + order.word() + ", shown by " + text(header, cell) + " in "
                    + header.place(cell.line(), cell.column());
            return new DateReading(order, Optional.of(why), Optional.empty());
        }
        if (unclear.isEmpty()) {
            return new DateReading(DateOrder.DAY_FIRST, Optional.empty(), Optional.empty());
        }
        List<DateOrder> possible = dayFirst.isPresent()
                ? List.of()
                : List.of(DateOrder.values()).stream()
                        .filter(order -> follow(body, order))
                        .toList();
        if (possible.size() == 1) {
            DateOrder order = possible.get(0);
            String why = "Dates: " + order.word() + "; " + order.other().word()
                    + " they would not make periods that follow one another";
            return new DateReading(order, Optional.of(why), Optional.empty());
        }
        long more = cells.stream().filter(cell -> cell.cell().isAmbiguous()).count() - 1;
        return new DateReading(DateOrder.DAY_FIRST, Optional.empty(), unclear.map(cell -> ask(header, cell, more)));
    }

    private static Finding ask(Header header, Cell cell, long more) {
        return Finding.error(
                        "date-ambiguous",
                        header.place(cell.line(), cell.column()),
                        "may be " + cell.cell().dayFirst().orElseThrow() + " or "
                                + cell.cell().monthFirst().orElseThrow()
                                + ", and nothing in the file tells which"
                                + (more > 0 ? " (" + more + " more like it)" : ""))
                .found(text(header, cell))
                .allowed("dates = day-first | month-first");
    }

    /** Whether every line makes a period of 20 to 100 days, or a month, and none holds a day of another but its last. */
    private static boolean follow(Body body, DateOrder order) {
        TreeSet<Period> sorted = new TreeSet<>();
        for (Body.BilledLine line : body.months()) {
            Optional<Period> period = line.period().period(order);
            if (period.isEmpty()
                    || period.get().days() < 20
                    || period.get().days() > 100
                    || !sorted.add(period.get())) {
                return false;
            }
        }
        Optional<LocalDate> last = Optional.empty();
        for (Period period : sorted) {
            if (last.filter(day -> day.isAfter(period.first())).isPresent()) {
                return false;
            }
            last = Optional.of(period.last());
        }
        return !sorted.isEmpty();
    }

    private static Optional<Cell> proof(List<Cell> cells, DateOrder order) {
        return cells.stream()
                .filter(cell -> cell.cell().proves().filter(order::equals).isPresent())
                .findFirst();
    }

    private static List<Cell> cells(Header header, Body body) {
        List<Cell> cells = new ArrayList<>();
        for (Body.BilledLine line : body.months()) {
            for (int column = 0; column < header.headings().size(); column++) {
                if (header.headings().get(column).meaning() instanceof Meaning.Date) {
                    int at = column;
                    PeriodText.of(header.sheet().cell(line.line(), column))
                            .cells()
                            .forEach(cell -> cells.add(new Cell(cell, line.line(), at)));
                }
            }
        }
        return cells;
    }

    private static String text(Header header, Cell cell) {
        return header.sheet().cell(cell.line(), cell.column());
    }
}
