// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.ArrayList;
import java.util.List;
import tariff.meter.MeteredMonth;
import tariff.notice.Finding;

/**
 * What is doubtful about the readings of bills, named before anything is worked out from them. All are warnings but two periods that
 * share days, which cannot both be billed.
 */
public final class BillDoubts {
    private BillDoubts() {}

    /**
     * The doubts period by period.
     *
     * @param months in any order; they may overlap
     */
    public static List<Finding> of(List<MeteredMonth> months) {
        List<MeteredMonth> sorted = months.stream().sorted().toList();
        List<Finding> all = new ArrayList<>(PeriodDoubts.of(sorted));
        sorted.forEach(month -> all.addAll(new MonthDoubts(month).all()));
        all.addAll(YearDoubts.of(sorted));
        return all.stream()
                .sorted(java.util.Comparator.comparingInt(finding -> place(sorted, finding)))
                .toList();
    }

    private static int place(List<MeteredMonth> sorted, Finding finding) {
        return sorted.stream().map(month -> month.period().toString()).toList().indexOf(finding.where());
    }
}
