// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

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
}
