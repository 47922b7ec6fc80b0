// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Optional;
import tariff.meter.DemandInterval;
import tariff.meter.IntervalRange;
import tariff.meter.IntervalSeries;
import tariff.meter.Window;

/**
 * A fixed bank run through an interval series, on unless a time switch says otherwise: each interval's lagging − leading kvar less the bank's. The bank's
 * effective kvar are taken as constant; voltage, frequency and ageing are for the caller to put in.
 */
public final class BankWalk {
    /** Above any bank, and low enough for exact sums. */
    private static final BigDecimal LARGEST_KVAR = BigDecimal.valueOf(1_000_000);

    private BankWalk() {}

    /**
     * Energies and peaks after the bank, in one pass. Sums are exact to the division by intervals per hour, which is made once.
     *
     * @param kvar effective output, 0 to 1,000,000 kvar, with no more decimals than the series has
     * @param demand counted from the start of the range
     * @throws IllegalArgumentException if the bank is outside its range or the series cannot give such blocks
     */
    public static ReactiveOutcome fixed(
            IntervalSeries series, IntervalRange range, DemandInterval demand, BigDecimal kvar) {
        long bank = scaled(series, kvar);
        ReactiveTally tally = new ReactiveTally(series, demand);
        tally.addAll(range, bank);
        return tally.outcome();
    }

    /**
     * The series as the meter would have recorded it behind the bank, so that any rate can be asked again. The bank's energy
     * in an interval is rounded half up to the scale of the series, which touches 5- and 10-minute steps only.
     *
     * @throws IllegalArgumentException as {@link #fixed}
     */
    public static IntervalSeries corrected(IntervalSeries series, BigDecimal kvar) {
        return corrected(series, kvar, Optional.empty());
    }

    /** @param off when a time switch keeps the bank off; an interval goes by its start */
    static IntervalSeries corrected(IntervalSeries series, BigDecimal kvar, Optional<Window> off) {
        TimeSwitch timeSwitch = new TimeSwitch(series, off);
        long bankKvarh = scaledKvarh(series, kvar);
        Correction correction = new Correction(series);
        for (int i = 0; i < series.size(); i++) {
            correction.set(i, timeSwitch.isOff(i) ? 0 : bankKvarh);
        }
        return correction.series();
    }

    /** What the bank gives in an interval, in the units of the series, rounded half up. */
    static long scaledKvarh(IntervalSeries series, BigDecimal kvar) {
        return Math.floorDiv(2 * scaled(series, kvar) + series.perHour(), 2 * series.perHour());
    }

    /** The bank's kvar in the units of the series. */
    static long scaled(IntervalSeries series, BigDecimal kvar) {
        if (kvar.signum() < 0 || kvar.compareTo(LARGEST_KVAR) > 0) {
            throw new IllegalArgumentException("a bank of " + kvar.toPlainString() + " kvar; allowed: 0 to 1000000");
        }
        if (kvar.stripTrailingZeros().scale() > series.scale()) {
            throw new IllegalArgumentException(
                    "a bank of " + kvar.toPlainString() + " kvar has more decimals than the series, " + series.scale());
        }
        return kvar.setScale(series.scale(), RoundingMode.UNNECESSARY)
                .unscaledValue()
                .longValueExact();
    }
}
