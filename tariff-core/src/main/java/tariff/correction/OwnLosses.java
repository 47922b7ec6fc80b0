// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.math.BigDecimal;
import java.math.RoundingMode;
import tariff.meter.IntervalSeries;

/**
 * The heat of a bank, which the meter counts as kWh: kvarh delivered × W per kvar ÷ 1000. What is delivered in an interval is by how much
 * its lagging − leading kvarh fell.
 *
 * <p>The sum from the first interval on is rounded half up to the scale of the series and what rounding leaves over is carried on, as a
 * register does: an interval alone is often less than the last digit, a month is not. Exact, in whole numbers.
 */
final class OwnLosses {
    private static final int WATT_DECIMALS = 3;
    private static final long MILLIWATTS_A_KILOWATT = 1_000_000;

    private OwnLosses() {}

    /**
     * The series behind a bank with the bank's losses in it; an absent interval loses nothing.
     *
     * @param before the meter without the bank
     * @param after the meter with it, its kWh still as they were
     * @param wattsPerKvar 0 to 1000 W, rounded half up to three decimals
     */
    static IntervalSeries in(IntervalSeries before, IntervalSeries after, BigDecimal wattsPerKvar) {
        long milliwatts = wattsPerKvar
                .setScale(WATT_DECIMALS, RoundingMode.HALF_UP)
                .unscaledValue()
                .longValueExact();
        if (milliwatts == 0) {
            return after;
        }
        long[] kwh = new long[after.size()];
        long carried = MILLIWATTS_A_KILOWATT / 2;
        for (int i = 0; i < kwh.length; i++) {
            long delivered = net(before, i) - net(after, i);
            long whole = delivered / MILLIWATTS_A_KILOWATT * milliwatts;
            carried += delivered % MILLIWATTS_A_KILOWATT * milliwatts;
            kwh[i] = after.scaledKwh(i) + whole + carried / MILLIWATTS_A_KILOWATT;
            carried %= MILLIWATTS_A_KILOWATT;
        }
        return after.withActive(kwh);
    }

    private static long net(IntervalSeries series, int interval) {
        return series.scaledLaggingKvarh(interval) - series.scaledLeadingKvarh(interval);
    }
}
