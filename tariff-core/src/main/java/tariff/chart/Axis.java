// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

import java.util.List;
import java.util.stream.LongStream;

/**
 * An axis with ticks at 1, 2, 2.5 or 5 times a power of ten, ends included.
 *
 * @param first the first tick in steps
 * @param last the last tick in steps, above the first
 * @param step distance of two ticks, above 0
 * @param decimals that the labels need
 */
record Axis(long first, long last, double step, int decimals) {

    /**
     * An axis that holds two values and zero.
     *
     * @param about how many ticks are welcome
     */
    static Axis holding(double low, double high, int about) {
        return of(low, high, about, 0);
    }

    /** The same with whole numbers only. */
    static Axis whole(double low, double high, int about) {
        return of(low, high, about, 1);
    }

    private static Axis of(double low, double high, int about, double leastStep) {
        double from = Math.min(0, low);
        double to = low < 0 || high > 0 ? Math.max(0, high) : 1;
        double step = Math.max(leastStep, niceStep((to - from) / about));
        if (leastStep == 1 && step == 2.5) {
            step = 5;
        }
        long first = (long) Math.floor(from / step + 1e-9);
        long last = Math.max(first + 1, (long) Math.ceil(to / step - 1e-9));
        return new Axis(first, last, step, decimals(step));
    }

    private static double niceStep(double least) {
        double power = StrictMath.pow(10, Math.floor(StrictMath.log10(least)));
        for (double nice : new double[] {1, 2, 2.5, 5}) {
            if (nice * power >= least * (1 - 1e-9)) {
                return nice * power;
            }
        }
        return 10 * power;
    }

    private static int decimals(double step) {
        int decimals = 0;
        for (double scaled = step; decimals < 9 && Math.abs(scaled - Math.rint(scaled)) > 1e-6; scaled *= 10) {
            decimals++;
        }
        return decimals;
    }

    List<Double> ticks() {
        return LongStream.rangeClosed(first, last).mapToObj(each -> each * step).toList();
    }

    String label(double value) {
        return Numbers.shown(value, decimals);
    }

    /** Where a value lies, 0 at the first tick and 1 at the last. */
    double share(double value) {
        return (value / step - first) / (last - first);
    }

    /** Width of the widest label. */
    double labelWidth(int size) {
        return ticks().stream()
                .mapToDouble(tick -> Lettering.width(label(tick), size))
                .max()
                .orElse(0);
    }
}
