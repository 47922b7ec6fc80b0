// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Optional;
import tariff.meter.IntervalSeries;
import tariff.meter.MeteredMonth;
import tariff.meter.MonthlySums;
import tariff.meter.Period;

/**
 * A bank run through a series of intervals: what the meter would have recorded, with nothing left to bounds. The fixed kvar are on in
 * every interval but those in which a time switch keeps the bank off; the steps follow what is left, as their controller is told. The
 * bank's own losses are counted as kWh where its kvar are given.
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
                : BankWalk.corrected(series, atScale(bank.effectiveFixedKvar(), series), bank.off());
        Optional<SteppedWalk> steps = bank.isAutomatic()
                ? Optional.of(SteppedWalk.of(fixed, fixed.all(), before.demand(), stepped(bank, series)))
                : Optional.empty();
        IntervalSeries corrected = steps.map(SteppedWalk::corrected).orElse(fixed);
        return new BankYear(before, before.on(OwnLosses.in(series, corrected, bank.wattsPerKvar())), steps);
    }

    private static SteppedBank stepped(CapacitorBank bank, IntervalSeries series) {
        Controller told = bank.controller();
        return new SteppedBank(
                bank.effectiveStepsKvar().stream()
                        .map(step -> atScale(step, series))
                        .toList(),
                SteppedBank.Target.powerFactor(told.targetPowerFactor().orElse(BigDecimal.ONE)),
                told.delayIntervals(series.stepMinutes()),
                told.operationsPerHour(),
                bank.off());
    }

    /** The month as the meter would have recorded it with the bank. */
    public MeteredMonth month(Period period) {
        return after.month(period);
    }

    private static BigDecimal atScale(BigDecimal kvar, IntervalSeries series) {
        return kvar.setScale(series.scale(), RoundingMode.HALF_UP);
    }
}
