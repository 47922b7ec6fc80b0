// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tariff.csv.PeriodReading.Billed;
import tariff.meter.Period;
import tariff.notice.Finding;

/** Whether periods follow one another: none twice, none over another, none missing, none far from a month. */
final class Sequence {
    private static final int SHORTEST_DAYS = 25;
    private static final int LONGEST_DAYS = 36;

    private Sequence() {}

    /** @param sorted by date */
    static List<Finding> check(Sheet sheet, List<Billed> sorted) {
        List<Finding> findings = new ArrayList<>();
        Optional<Billed> latest = Optional.empty();
        for (Billed each : sorted) {
            int days = each.period().days();
            if (days < SHORTEST_DAYS || days > LONGEST_DAYS) {
                findings.add(Finding.warning(
                                "period-length",
                                sheet.linePlace(each.line()),
                                "bills " + days + (days == 1 ? " day" : " days") + ", which is not a month")
                        .found(each.period().toString()));
            }
            latest.ifPresent(before -> compare(sheet, before, each, findings));
            boolean endsLast = latest.filter(before ->
                            before.period().last().isAfter(each.period().last()))
                    .isEmpty();
            latest = endsLast ? Optional.of(each) : latest;
        }
        return findings;
    }

    private static void compare(Sheet sheet, Billed before, Billed next, List<Finding> findings) {
        if (before.period().equals(next.period())) {
            findings.add(Finding.error(
                            "period-twice",
                            sheet.linePlace(next.line()),
                            "bills the same days as " + sheet.linePlace(before.line()))
                    .found(next.period().toString()));
        } else if (before.period().overlap(next.period()) > 0) {
            findings.add(Finding.error(
                            "periods-overlap",
                            sheet.linePlace(next.line()),
                            "bills days that " + sheet.linePlace(before.line()) + " bills too")
                    .found(next.period() + " and " + before.period()));
        } else {
            LocalDate gapStart = before.period().last().plusDays(1);
            LocalDate gapEnd = next.period().first().minusDays(1);
            if (!gapEnd.isBefore(gapStart)) {
                findings.add(Finding.warning(
                                "period-missing",
                                sheet.linePlace(next.line()),
                                "does not follow the period before it; days between are not billed")
                        .found("nothing for " + new Period(gapStart, gapEnd)));
            }
        }
    }
}
