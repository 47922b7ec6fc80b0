// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;
import tariff.meter.MeteredMonth;
import tariff.meter.Period;
import tariff.notice.Finding;

/** Doubts about the days billed: overlaps, gaps, unusual lengths. */
final class PeriodDoubts {
    private static final int USUAL_DAYS = 30;
    private static final int FEW = 3;

    /** Readings fall on working days and around holidays. Common practice, no source. */
    private static final int LEEWAY_DAYS = 5;

    private PeriodDoubts() {}

    static List<Finding> of(List<MeteredMonth> sorted) {
        List<Finding> all = new ArrayList<>();
        List<Integer> lengths =
                sorted.stream().map(month -> month.period().days()).sorted().toList();
        int usual = lengths.size() < FEW ? USUAL_DAYS : lengths.get(lengths.size() / 2);
        for (int i = 0; i < sorted.size(); i++) {
            Period period = sorted.get(i).period();
            if (i > 0) {
                neighbours(sorted.get(i - 1).period(), period, all);
            }
            if (Math.abs(period.days() - usual) > LEEWAY_DAYS) {
                all.add(Finding.warning(
                        "period-length",
                        period.toString(),
                        days(period.days()) + " are billed, where " + (usual - LEEWAY_DAYS) + " to "
                                + (usual + LEEWAY_DAYS) + " are expected; check the first and the last day"));
            }
        }
        return all;
    }

    private static void neighbours(Period before, Period after, List<Finding> all) {
        long shared = before.overlap(after);
        long between = ChronoUnit.DAYS.between(before.last(), after.first()) - 1;
        if (shared > 0) {
            all.add(Finding.error(
                    "overlap",
                    after.toString(),
                    before.equals(after)
                            ? "is given twice; leave one out"
                            : "shares " + days(shared) + " with " + before + "; a day belongs to one period"));
        } else if (between > 0) {
            all.add(Finding.warning(
                    "gap",
                    after.toString(),
                    days(between) + " between " + before + " and this period are on no bill; give the bill between, or"
                            + " correct the days"));
        }
    }

    private static String days(long days) {
        return days + (days == 1 ? " day" : " days");
    }
}
