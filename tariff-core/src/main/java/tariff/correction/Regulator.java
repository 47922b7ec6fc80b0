// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.util.Arrays;
import tariff.meter.IntervalSeries;

/** Decides which steps are in, one interval after another. Reactive power is in scaled kvar. */
final class Regulator {
    private final IntervalSeries series;
    private final SteppedBank bank;
    private final long[] steps;
    private final Combinations combinations;
    private final long targetKvar;
    private final long total;
    /** Three times the dead band either side, to stay whole. */
    private final long bandTimesThree;
    /** Operations in each interval of the hour that has just passed, in a ring. */
    private final int[] lastHour;

    private int[] on;
    private int wanting;

    Regulator(IntervalSeries series, SteppedBank bank) {
        this.series = series;
        this.bank = bank;
        this.steps = bank.stepsKvar().stream()
                .mapToLong(step -> BankWalk.scaled(series, step))
                .toArray();
        this.combinations = new Combinations(steps);
        this.targetKvar = BankWalk.scaled(series, bank.target().kvar());
        this.total = Arrays.stream(steps).sum();
        this.bandTimesThree = 2 * Arrays.stream(steps).min().orElseThrow();
        this.lastHour = new int[series.perHour()];
        this.on = combinations.none();
    }

    void regulate(int interval, boolean off) {
        int slot = interval % lastHour.length;
        lastHour[slot] = 0;
        if (series.isAbsent(interval)) {
            return;
        }
        if (off) {
            change(combinations.none(), slot);
            wanting = 0;
            return;
        }
        long kw = series.scaledKwh(interval) * series.perHour();
        long net = (series.scaledLaggingKvarh(interval) - series.scaledLeadingKvarh(interval)) * series.perHour();
        long wanted = net - targetKvar - Math.round(kw * bank.target().tanPhi());
        if (3 * Math.abs(wanted - output()) <= bandTimesThree) {
            wanting = 0;
        } else if (wanting++ >= bank.delayIntervals()) {
            int allowed = bank.operationsPerHour()
                    .map(most -> Math.max(0, most - Arrays.stream(lastHour).sum()))
                    .orElse(Integer.MAX_VALUE);
            change(combinations.nearest(wanted, on, allowed), slot);
        }
    }

    private void change(int[] next, int slot) {
        lastHour[slot] += Combinations.operations(on, next);
        on = next;
    }

    /** How many steps of each size are in. */
    int[] on() {
        return on.clone();
    }

    long output() {
        return combinations.output(on);
    }

    boolean isFull() {
        return output() == total;
    }

    long[] steps() {
        return steps.clone();
    }

    long[] sizes() {
        return combinations.sizes();
    }
}
