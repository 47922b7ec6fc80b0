// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tariff.meter.Period;
import tariff.notice.Finding;

/**
 * The periods of the lines, sorted by date.
 *
 * @param understood said if the last days turned out to be days of meter reading
 */
record PeriodReading(List<Billed> billed, List<String> understood, List<Finding> findings) {

    /** A line and its period. */
    record Billed(int line, Period period) {}

    static PeriodReading of(Header header, Body body, DateOrder order) {
        List<Finding> findings = new ArrayList<>();
        List<Billed> billed = new ArrayList<>();
        for (Body.BilledLine line : body.months()) {
            Optional<Period> period = line.period().period(order);
            if (period.isPresent()) {
                billed.add(new Billed(line.line(), period.get()));
            } else {
                findings.add(refuse(header.sheet(), line, order));
            }
        }
        billed.sort((a, b) -> a.period().compareTo(b.period()));
        boolean shared = sharesDays(billed);
        List<Billed> settled =
                shared ? billed.stream().map(PeriodReading::withoutLastDay).toList() : billed;
        List<String> understood = shared
                ? List.of(
                        "Periods: each ends on the day the next begins, so the end is a day of meter reading and the last day"
                                + " billed is the day before")
                : List.of();
        findings.addAll(Sequence.check(header.sheet(), settled));
        if (billed.size() == 1 && maySpanReadings(billed.get(0).period())) {
            findings.add(Finding.warning(
                    "reading-day-unknown",
                    header.sheet().linePlace(billed.get(0).line()),
                    "begins and ends on the same day of a month; if the end is a day of meter reading, the last day billed is"
                            + " the day before"));
        }
        return new PeriodReading(settled, understood, findings);
    }

    private static Finding refuse(Sheet sheet, Body.BilledLine line, DateOrder order) {
        boolean one = line.period().cells().size() == 1;
        boolean noSuchDay = line.period().cells().stream()
                .anyMatch(cell -> cell.month().isEmpty() && cell.day(order).isEmpty());
        if (noSuchDay) {
            return Finding.error(
                            "no-such-day",
                            sheet.linePlace(line.line()),
                            "names a day that does not exist if dates are " + order.word())
                    .found(line.written());
        }
        return one
                ? Finding.error(
                                "one-day",
                                sheet.linePlace(line.line()),
                                "gives one day, which does not say which days were billed")
                        .found(line.written())
                        .allowed("a month, the first or last day of a month, or From and To")
                : Finding.error("ends-before-start", sheet.linePlace(line.line()), "ends before it begins")
                        .found(line.written());
    }

    private static boolean sharesDays(List<Billed> billed) {
        boolean any = false;
        for (int i = 1; i < billed.size(); i++) {
            Period before = billed.get(i - 1).period();
            Period next = billed.get(i).period();
            if (before.last().plusDays(1).equals(next.first()) || before.days() < 2 || next.days() < 2) {
                return false;
            }
            any |= before.last().equals(next.first());
        }
        return any;
    }

    private static Billed withoutLastDay(Billed billed) {
        return new Billed(
                billed.line(),
                new Period(billed.period().first(), billed.period().last().minusDays(1)));
    }

    private static boolean maySpanReadings(Period period) {
        return period.days() > 1
                && period.first().getDayOfMonth() == period.last().getDayOfMonth();
    }
}
