// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import java.util.List;
import java.util.TreeSet;

/** The totals that a bank's steps can make, so that none escapes a check. */
public final class StepCombinations {
    /** Totals nearer than this are one [kvar], or nearer than a 100 000th of the bank: neither moves a resonance that can be measured. */
    private static final double RESOLUTION_KVAR = 0.01;

    private StepCombinations() {}

    /**
     * Every distinct total of one or more steps [kvar], rising. 25 + 25 + 50 gives 25, 50, 75, 100.
     *
     * @param stepsKvar each above 0 [kvar]
     * @throws IllegalArgumentException if a step is not above 0
     */
    public static List<Double> totalsKvar(List<Double> stepsKvar) {
        double total = 0;
        for (double step : stepsKvar) {
            total += Given.positive("stepsKvar", step, "kvar");
        }
        double resolution = Math.max(RESOLUTION_KVAR, total / 100_000);
        TreeSet<Long> sums = new TreeSet<>(List.of(0L));
        for (double step : stepsKvar) {
            long units = Math.max(1, Math.round(step / resolution));
            sums.addAll(sums.stream().map(sum -> sum + units).toList());
        }
        return sums.stream().filter(sum -> sum > 0).map(sum -> sum * resolution).toList();
    }
}
