// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.util.Map;

/**
 * The rows of a file in whole numbers, in the order of the file.
 *
 * @param count how many there are; the arrays may have room for more
 * @param rounded figures that had more decimals than are kept
 */
@SuppressWarnings("ArrayRecordComponent")
record RawColumns(int count, long[] stamps, int[] lines, Map<Role, long[]> figures, long rounded) {

    /** Turns a file that has its newest row first. */
    void reverse() {
        for (int i = 0, j = count() - 1; i < j; i++, j--) {
            swap(stamps, i, j);
            for (long[] each : figures.values()) {
                swap(each, i, j);
            }
            int line = lines[i];
            lines[i] = lines[j];
            lines[j] = line;
        }
    }

    private static void swap(long[] values, int i, int j) {
        long value = values[i];
        values[i] = values[j];
        values[j] = value;
    }
}
