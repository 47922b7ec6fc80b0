// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import tariff.meter.DemandInterval;
import tariff.meter.IntervalRange;
import tariff.meter.IntervalSeries;

/**
 * An automatic bank run through an interval series.
 *
 * @param outcome the registers after it
 * @param operations how often each step was switched in or out, in the order of the bank's steps; the least worn step of a size
 *     goes in first, the most worn out first
 * @param hoursAtFullOutput hours with every step in
 * @param corrected the series as the meter would have recorded it, outside the range as it was
 */
public record SteppedWalk(
        ReactiveOutcome outcome, List<Integer> operations, BigDecimal hoursAtFullOutput, IntervalSeries corrected) {
    /**
     * Within an interval the bank is as it was set at its start, from that interval's own averages. An absent interval leaves
     * it as it stands. The bank starts switched off.
     *
     * @throws IllegalArgumentException if a step is finer than the series, the steps make too many combinations, or the series
     *     cannot give such demand blocks
     */
    public static SteppedWalk of(IntervalSeries series, IntervalRange range, DemandInterval demand, SteppedBank bank) {
        TimeSwitch timeSwitch = new TimeSwitch(series, bank.off());
        Regulator regulator = new Regulator(series, bank);
        Wear wear = new Wear(regulator.steps());
        ReactiveTally tally = new ReactiveTally(series, demand);
        Correction correction = new Correction(series);
        for (int i = 0; i < series.size(); i++) {
            correction.set(i, 0);
        }
        int full = 0;
        for (int i = range.from(); i < range.to(); i++) {
            regulator.regulate(i, timeSwitch.isOff(i));
            wear.follow(regulator.on(), regulator.sizes());
            full += regulator.isFull() ? 1 : 0;
            long output = regulator.output();
            tally.add(i, output);
            correction.set(i, Math.floorDiv(2 * output + series.perHour(), 2 * series.perHour()));
        }
        BigDecimal hours = BigDecimal.valueOf((long) full * series.stepMinutes())
                .divide(BigDecimal.valueOf(60), 2, RoundingMode.HALF_UP);
        return new SteppedWalk(tally.outcome(), wear.operations(), hours, correction.series());
    }

    /** Which steps of each size have worked how often. */
    private static final class Wear {
        private final long[] steps;
        private final int[] count;
        private final boolean[] in;

        Wear(long[] steps) {
            this.steps = steps;
            this.count = new int[steps.length];
            this.in = new boolean[steps.length];
        }

        void follow(int[] on, long[] sizes) {
            for (int size = 0; size < sizes.length; size++) {
                while (in(sizes[size]) < on[size]) {
                    turn(sizes[size], false);
                }
                while (in(sizes[size]) > on[size]) {
                    turn(sizes[size], true);
                }
            }
        }

        private int in(long size) {
            int sum = 0;
            for (int i = 0; i < steps.length; i++) {
                sum += in[i] && steps[i] == size ? 1 : 0;
            }
            return sum;
        }

        private void turn(long size, boolean isIn) {
            int chosen = -1;
            for (int i = 0; i < steps.length; i++) {
                if (steps[i] == size && in[i] == isIn && (chosen < 0 || before(count[i], count[chosen], isIn))) {
                    chosen = i;
                }
            }
            in[chosen] = !isIn;
            count[chosen]++;
        }

        private static boolean before(int one, int other, boolean mostWorn) {
            return mostWorn ? one > other : one < other;
        }

        List<Integer> operations() {
            List<Integer> list = new ArrayList<>();
            for (int each : count) {
                list.add(each);
            }
            return List.copyOf(list);
        }
    }
}
