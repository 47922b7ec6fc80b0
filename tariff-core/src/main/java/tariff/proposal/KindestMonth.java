// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import static tariff.meter.Register.APPARENT_KVAH;
import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.LAGGING_KVARH;
import static tariff.meter.Register.LEADING_KVARH;
import static tariff.meter.Register.PEAK_KVA;
import static tariff.meter.Register.PEAK_KW;
import static tariff.meter.Register.PEAK_LAGGING_KVAR;
import static tariff.meter.Register.PEAK_LEADING_KVAR;
import static tariff.meter.Register.POWER_FACTOR;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.TreeMap;
import tariff.correction.BankMonth;
import tariff.correction.CapacitorBank;
import tariff.correction.Controller;
import tariff.correction.Estimate;
import tariff.meter.MeteredMonth;
import tariff.meter.Readings;
import tariff.meter.Register;
import tariff.meter.Triangle;
import tariff.rate.Rate;

/**
 * A month whose every reading is at least as good as with any bank between two: nothing lags more than with the larger one, nothing leads
 * more than with the smaller one, the controller is as fine as the finer one. No single bank need reach it; its bill is a floor under the
 * bills of all of them. Own derivation: lagging kvarh and kvar fall with all kvar of a bank and rise with its smallest step; leading ones
 * rise with its fixed kvar and smallest step; kVA falls with all kvar and rises with fixed kvar and smallest step. In the central estimate
 * coarse steps may happen to fit the load better than fine ones; there nothing lags more than with all kvar always on, and only fixed kvar
 * lead. A time switch is the same for all of them: it leaves each the same hours, so the same holds in those.
 *
 * <p>A bank's own losses raise kWh and kW, the larger bank's most. Their amounts are those of the smaller bank; in the central and high
 * estimates, where coarse steps may deliver less, those of its fixed kvar alone. More losses might help a power factor or a share of the kWh, so everything
 * reactive and the kVA are lowered in the same ratio.
 */
final class KindestMonth {
    /** A step too small to leave a trace, for a bank that has none. */
    private static final BigDecimal TRACE = new BigDecimal("0.000000001");

    private final BankMonth withSmaller;
    private final BankMonth withLarger;
    private final BankMonth leastLagging;
    private final BankMonth leastApparent;
    private final Estimate estimate;

    KindestMonth(CapacitorBank smaller, CapacitorBank larger, Rate rate, Estimate estimate) {
        BigDecimal step = smaller.stepsKvar().stream()
                .min(BigDecimal::compareTo)
                .orElse(larger.isAutomatic() ? TRACE : BigDecimal.ZERO);
        this.withSmaller =
                month(estimate == Estimate.LOW ? smaller : smaller.withKvar(smaller.fixedKvar(), List.of()), rate);
        this.withLarger = month(larger, rate);
        this.leastLagging = month(leastLagging(larger, step, estimate), rate);
        this.leastApparent =
                month(divided(larger, smaller.fixedKvar(), step.max(TRACE)).withLosses(BigDecimal.ZERO), rate);
        this.estimate = estimate;
    }

    private static CapacitorBank leastLagging(CapacitorBank larger, BigDecimal step, Estimate estimate) {
        if (estimate == Estimate.CENTRAL) {
            return larger.withKvar(larger.ratedKvar(), List.of());
        }
        return larger.isAutomatic() ? divided(larger, larger.fixedKvar(), step) : larger;
    }

    private static BankMonth month(CapacitorBank bank, Rate rate) {
        return new BankMonth(bank, rate.windows(), rate.zone());
    }

    MeteredMonth of(MeteredMonth month) {
        MeteredMonth small = withSmaller.with(month, estimate);
        MeteredMonth large = withLarger.with(month, estimate);
        MeteredMonth lagging = leastLagging.with(month, estimate);
        MeteredMonth apparent = leastApparent.with(month, estimate);
        Map<String, Readings> windows = new TreeMap<>();
        month.windows()
                .keySet()
                .forEach(name -> windows.put(
                        name,
                        best(window(small, name), window(large, name), window(lagging, name), window(apparent, name))));
        return month.with(best(small.totals(), large.totals(), lagging.totals(), apparent.totals()))
                .withWindows(windows);
    }

    private static Readings best(Readings small, Readings large, Readings lagging, Readings apparent) {
        Readings best = peaks(small, large, apparent);
        if (lagging.has(LAGGING_KVARH)) {
            BigDecimal lags = lagging.get(LAGGING_KVARH).orElseThrow();
            BigDecimal leads = small.get(LEADING_KVARH).orElse(BigDecimal.ZERO);
            if (small.has(ENERGY_KWH)) {
                BigDecimal kwh = small.get(ENERGY_KWH).orElseThrow();
                BigDecimal ratio = ratio(kwh, large.get(ENERGY_KWH), lagging.get(ENERGY_KWH));
                lags = lags.multiply(ratio);
                leads = leads.multiply(ratio);
                best = best.with(ENERGY_KWH, kwh);
                if (best.has(APPARENT_KVAH)) {
                    best = best.with(APPARENT_KVAH, Triangle.apparent(kwh, lags.add(leads)));
                }
                if (best.has(POWER_FACTOR) && kwh.signum() > 0) {
                    best = best.with(POWER_FACTOR, Triangle.powerFactor(kwh, Triangle.apparent(kwh, lags)));
                }
            }
            best = best.with(LAGGING_KVARH, lags).with(LEADING_KVARH, leads);
        }
        return best;
    }

    private static Readings peaks(Readings small, Readings large, Readings apparent) {
        Readings best = apparent;
        if (small.has(PEAK_KW)) {
            BigDecimal kw = small.get(PEAK_KW).orElseThrow();
            BigDecimal ratio = ratio(kw, large.get(PEAK_KW), Optional.empty());
            best = best.with(PEAK_KW, kw);
            for (Register register : List.of(PEAK_KVA, PEAK_LAGGING_KVAR, PEAK_LEADING_KVAR)) {
                Optional<BigDecimal> peak = best.get(register);
                best = peak.isPresent() ? best.with(register, peak.get().multiply(ratio)) : best;
            }
        }
        return best;
    }

    /** The least ÷ the most, at most 1. */
    private static BigDecimal ratio(BigDecimal least, Optional<BigDecimal> one, Optional<BigDecimal> other) {
        BigDecimal most = least.max(one.orElse(least)).max(other.orElse(least));
        return most.signum() > 0 ? least.divide(most, Triangle.PRECISION) : BigDecimal.ONE;
    }

    /** All kvar of a bank with so many of them fixed, the others in steps each twice as large as the one before, which leave no wider gap. */
    private static CapacitorBank divided(CapacitorBank bank, BigDecimal fixed, BigDecimal smallest) {
        List<BigDecimal> steps = new ArrayList<>();
        BigDecimal rest = bank.ratedKvar().subtract(fixed);
        for (BigDecimal step = smallest; step.compareTo(rest) < 0; step = step.add(step)) {
            steps.add(step);
            rest = rest.subtract(step);
        }
        steps.add(rest.signum() > 0 ? rest : smallest);
        return bank.withKvar(fixed, steps).withController(bank.isAutomatic() ? bank.controller() : Controller.quick());
    }

    private static Readings window(MeteredMonth month, String name) {
        return Objects.requireNonNull(month.windows().get(name));
    }
}
