// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import static tariff.meter.Register.APPARENT_KVAH;
import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.LAGGING_KVARH;
import static tariff.meter.Register.LEADING_KVARH;
import static tariff.meter.Register.POWER_FACTOR;

import java.math.BigDecimal;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.TreeMap;
import tariff.correction.BankMonth;
import tariff.correction.CapacitorBank;
import tariff.correction.Estimate;
import tariff.meter.MeteredMonth;
import tariff.meter.Readings;
import tariff.meter.Triangle;

/**
 * A month whose every reading is at least as good as with any bank between two: nothing lags more than with the larger one, nothing leads
 * more than with the smaller one, the controller is as fine as the finer one. No single bank need reach it; its bill is a floor under the
 * bills of all of them. Own derivation: lagging kvarh and kvar fall with all kvar of a bank and rise with its smallest step; leading ones
 * rise with its fixed kvar and smallest step; kVA falls with all kvar and rises with fixed kvar and smallest step.
 */
final class KindestMonth {
    /** A step too small to leave a trace, for a bank that has none. */
    private static final BigDecimal TRACE = new BigDecimal("0.000000001");

    private final BankMonth withSmaller;
    private final BankMonth leastLagging;
    private final BankMonth leastApparent;
    private final Estimate estimate;

    KindestMonth(CapacitorBank smaller, CapacitorBank larger, BankMonth.WindowHours hours, Estimate estimate) {
        BigDecimal step = smaller.stepsKvar().stream()
                .min(BigDecimal::compareTo)
                .orElse(larger.isAutomatic() ? TRACE : BigDecimal.ZERO);
        this.withSmaller = new BankMonth(smaller, hours);
        this.leastLagging =
                new BankMonth(larger.isAutomatic() ? divided(larger, larger.fixedKvar(), step) : larger, hours);
        this.leastApparent = new BankMonth(divided(larger, smaller.fixedKvar(), step.max(TRACE)), hours);
        this.estimate = estimate;
    }

    MeteredMonth of(MeteredMonth month) {
        MeteredMonth small = withSmaller.with(month, estimate);
        MeteredMonth lagging = leastLagging.with(month, estimate);
        MeteredMonth apparent = leastApparent.with(month, estimate);
        Map<String, Readings> windows = new TreeMap<>();
        apparent.windows()
                .forEach((name, readings) ->
                        windows.put(name, best(readings, window(lagging, name), window(small, name))));
        return month.with(best(apparent.totals(), lagging.totals(), small.totals()))
                .withWindows(windows);
    }

    private static Readings best(Readings apparent, Readings lagging, Readings small) {
        Readings best = apparent;
        if (lagging.has(LAGGING_KVARH)) {
            BigDecimal lags = lagging.get(LAGGING_KVARH).orElseThrow();
            BigDecimal leads = small.get(LEADING_KVARH).orElse(BigDecimal.ZERO);
            best = best.with(LAGGING_KVARH, lags).with(LEADING_KVARH, leads);
            if (small.has(ENERGY_KWH)) {
                BigDecimal kwh = small.get(ENERGY_KWH).orElseThrow();
                BigDecimal most = lagging.get(ENERGY_KWH).orElse(kwh).max(kwh);
                best = best.with(ENERGY_KWH, kwh);
                if (best.has(APPARENT_KVAH)) {
                    best = best.with(APPARENT_KVAH, Triangle.apparent(kwh, lags.add(leads)));
                }
                if (best.has(POWER_FACTOR) && most.signum() > 0) {
                    best = best.with(POWER_FACTOR, Triangle.powerFactor(most, Triangle.apparent(most, lags)));
                }
            }
        }
        return best;
    }

    /** All kvar of a bank with so many of them fixed, the others in steps of which the smallest is given. */
    private static CapacitorBank divided(CapacitorBank bank, BigDecimal fixed, BigDecimal smallest) {
        BigDecimal rest = bank.ratedKvar().subtract(fixed).subtract(smallest);
        return new CapacitorBank(
                fixed,
                rest.signum() > 0 ? List.of(smallest, rest) : List.of(smallest),
                bank.targetPowerFactor().filter(pf -> bank.isAutomatic()),
                bank.ratedVolts(),
                bank.serviceVolts(),
                bank.reactorShare(),
                bank.wattsPerKvar());
    }

    private static Readings window(MeteredMonth month, String name) {
        return Objects.requireNonNull(month.windows().get(name));
    }
}
