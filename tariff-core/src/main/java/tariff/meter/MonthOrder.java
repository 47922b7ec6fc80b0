// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;
import tariff.notice.Assumption;
import tariff.notice.Finding;
import tariff.notice.Refusal;

/** Puts billing periods in order and says where they do not join up. */
public final class MonthOrder {
    private MonthOrder() {}

    /**
     * The months in the order of their dates.
     *
     * @throws Refusal naming every two that share a day
     */
    public static List<MeteredMonth> of(List<MeteredMonth> months) {
        List<MeteredMonth> sorted = months.stream().sorted().toList();
        List<Finding> overlaps = new ArrayList<>();
        for (int i = 1; i < sorted.size(); i++) {
            Period before = sorted.get(i - 1).period();
            Period after = sorted.get(i).period();
            if (before.overlap(after) > 0) {
                overlaps.add(Finding.error(
                        "overlap",
                        after.toString(),
                        before.equals(after)
                                ? "is given twice"
                                : "shares " + before.overlap(after) + " days with " + before));
            }
        }
        if (!overlaps.isEmpty()) {
            throw new Refusal(overlaps);
        }
        return sorted;
    }

    /** What is assumed where months in order leave days out. */
    public static List<Assumption> gaps(List<MeteredMonth> sorted) {
        List<Assumption> gaps = new ArrayList<>();
        for (int i = 1; i < sorted.size(); i++) {
            Period before = sorted.get(i - 1).period();
            Period after = sorted.get(i).period();
            long days = ChronoUnit.DAYS.between(before.last(), after.first()) - 1;
            if (days > 0) {
                gaps.add(new Assumption(
                        "months-missing",
                        after.toString(),
                        days + " days between " + before + " and " + after
                                + " are not given; the months are taken to follow each other",
                        "give the bills between"));
            }
        }
        return gaps;
    }
}
