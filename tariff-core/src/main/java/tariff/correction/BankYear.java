// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import java.util.Optional;
import tariff.meter.IntervalSeries;
import tariff.meter.MeteredMonth;
import tariff.meter.MonthlySums;
import tariff.meter.Period;

/**
 * A bank run through a series of intervals: what the meter would have recorded, with nothing left to bounds. The fixed kvar are on in
 * every interval; the steps follow what is left, aiming at the bank's target power factor.
 *
 * @param before the meter without the bank
 * @param after the meter with it
 * @param steps what the switched steps did; empty for a fixed bank
 */
public record BankYear(MonthlySums before, MonthlySums after, Optional<SteppedWalk> steps) {

    /**
     * Runs the bank through the whole series. Its effective kvar are rounded half up to the decimals of the series.
     *
     * @throws IllegalArgumentException if the steps make too many combinations for a controller to choose from
     */
    public static BankYear of(MonthlySums before, CapacitorBank bank) {
        IntervalSeries series = before.series();
        IntervalSeries fixed = bank.fixedKvar().signum() == 0
                ? series
                : BankWalk.corrected(series, atScale(bank.effectiveFixedKvar(), series));
        if (!bank.isAutomatic()) {
            return new BankYear(before, before.on(fixed), Optional.empty());
        }
        List<BigDecimal> kvar = bank.effectiveStepsKvar().stream()
                .map(step -> atScale(step, series))
                .toList();
        SteppedBank.Target target =
                SteppedBank.Target.powerFactor(bank.targetPowerFactor().orElse(BigDecimal.ONE));
        SteppedWalk walk = SteppedWalk.of(
                fixed,
                fixed.all(),
                before.demand(),
                new SteppedBank(kvar, target, 0, Optional.empty(), Optional.empty()));
        return new BankYear(before, before.on(walk.corrected()), Optional.of(walk));
    }

    /** The month as the meter would have recorded it with the bank. */
    public MeteredMonth month(Period period) {
        return after.month(period);
    }

    private static BigDecimal atScale(BigDecimal kvar, IntervalSeries series) {
        return kvar.setScale(series.scale(), RoundingMode.HALF_UP);
    }
}
