// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

/**
 * Intervals of a series that follow one another.
 *
 * @param from the first, counted from 0
 * @param to the one after the last, not below {@code from}
 */
public record IntervalRange(int from, int to) {
    public IntervalRange {
        if (from < 0 || to < from) {
            throw new IllegalArgumentException("no intervals from " + from + " to " + to);
        }
    }

    public int size() {
        return to - from;
    }
}
