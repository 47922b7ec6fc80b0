// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.Arrays;

/**
 * A middle that single odd months do not move. A value is far from the others if 0.6745 × |value − median| ÷ MAD is above 3.5 (B. Iglewicz and
 * D. C. Hoaglin, How to Detect and Handle Outliers, 1993, from memory), where MAD is the median of the distances from the median; and
 * if it is further away than a distance below which nobody would ask.
 *
 * @param median of the values
 * @param mad median absolute deviation
 */
record Robust(double median, double mad) {
    private static final double NORMAL = 0.6745;
    private static final double FAR = 3.5;

    static Robust of(double[] values) {
        double middle = median(values);
        return new Robust(
                middle,
                median(Arrays.stream(values)
                        .map(value -> Math.abs(value - middle))
                        .toArray()));
    }

    boolean isFar(double value, double least) {
        double distance = Math.abs(value - median);
        return distance > least && NORMAL * distance > FAR * mad;
    }

    private static double median(double[] values) {
        double[] sorted = values.clone();
        Arrays.sort(sorted);
        int half = sorted.length / 2;
        return sorted.length % 2 == 1 ? sorted[half] : (sorted[half - 1] + sorted[half]) / 2;
    }
}
