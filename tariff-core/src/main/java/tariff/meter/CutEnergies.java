// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.util.stream.LongStream;

/**
 * The energies of each hour, day … of a period, as whole multiples of 10<sup>−scale</sup> kWh or kvarh: exact, and quick to add.
 *
 * @param scale decimals
 * @param kwh active energy taken in each
 * @param laggingKvarh as long as {@code kwh}
 * @param leadingKvarh as long as {@code kwh}
 * @param exportedKwh as long as {@code kwh}; zeros without the register
 */
@SuppressWarnings("ArrayRecordComponent") // lives for one question and is never compared
public record CutEnergies(int scale, long[] kwh, long[] laggingKvarh, long[] leadingKvarh, long[] exportedKwh) {

    public int size() {
        return kwh.length;
    }

    /**
     * The same energies with at least so many decimals.
     *
     * @throws ArithmeticException if one does not fit
     */
    public CutEnergies scaledTo(int decimals) {
        if (decimals <= scale) {
            return this;
        }
        long factor = LongStream.iterate(10, power -> 10 * power)
                .skip(decimals - scale - 1L)
                .findFirst()
                .orElseThrow();
        return new CutEnergies(
                decimals,
                times(factor, kwh),
                times(factor, laggingKvarh),
                times(factor, leadingKvarh),
                times(factor, exportedKwh));
    }

    private static long[] times(long factor, long[] values) {
        return LongStream.of(values)
                .map(value -> Math.multiplyExact(factor, value))
                .toArray();
    }
}
