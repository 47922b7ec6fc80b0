// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.util.Arrays;

/** The values of IntervalBlocks, in the order of the file. */
final class EspiValues {
    /** Decimals that are kept of a value in its own unit. */
    static final int DECIMALS = 3;
    /** Stands for a start that the feed does not give. */
    static final long NOT_SAID = Long.MIN_VALUE;

    private long[] starts = new long[96];
    private int[] seconds = new int[96];
    private long[] scaled = new long[96];
    private int[] lines = new int[96];
    private int count;
    private int estimated;

    /**
     * @param start seconds since 1970, or {@link #NOT_SAID}
     * @param length seconds, 0 if not said
     * @param value in thousandths of its unit
     * @param line of the file
     * @param isEstimated whether the feed marks it so
     */
    void add(long start, int length, long value, int line, boolean isEstimated) {
        if (count == starts.length) {
            int more = 2 * count;
            starts = Arrays.copyOf(starts, more);
            seconds = Arrays.copyOf(seconds, more);
            scaled = Arrays.copyOf(scaled, more);
            lines = Arrays.copyOf(lines, more);
        }
        starts[count] = start;
        seconds[count] = length;
        scaled[count] = value;
        lines[count++] = line;
        estimated += isEstimated ? 1 : 0;
    }

    void addAll(EspiValues others) {
        for (int i = 0; i < others.count; i++) {
            add(others.starts[i], others.seconds[i], others.scaled[i], others.lines[i], false);
        }
        estimated += others.estimated;
    }

    /** Gives readings that say no time their even share of their block's, one after another. */
    EspiValues spreadOver(long blockStart, int blockSeconds) {
        for (int i = 0; i < count && blockStart != NOT_SAID; i++) {
            if (starts[i] == NOT_SAID) {
                seconds[i] = blockSeconds / count;
                starts[i] = blockStart + (long) i * seconds[i];
            }
        }
        return this;
    }

    int count() {
        return count;
    }

    /** How many are marked as estimated, questionable or projected. */
    int estimated() {
        return estimated;
    }

    long start(int i) {
        return starts[i];
    }

    int seconds(int i) {
        return seconds[i];
    }

    long scaled(int i) {
        return scaled[i];
    }

    int line(int i) {
        return lines[i];
    }
}
