// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

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
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.function.Function;
import tariff.meter.Derivable;
import tariff.meter.MeteredMonth;
import tariff.meter.Readings;
import tariff.meter.Triangle;

/**
 * A month as the meter would have shown it with a bank in service. kW stay as they are but for the bank's own losses; kvarh and kVA move
 * as far as physics allows.
 *
 * @param bank the bank
 * @param windowHours hours of each of the rate's windows in a period; a window it does not know keeps its readings
 */
public record BankMonth(CapacitorBank bank, WindowHours windowHours) {
    private static final BigDecimal HOURS_A_DAY = BigDecimal.valueOf(24);
    private static final BigDecimal WATTS_A_KILOWATT = BigDecimal.valueOf(1000);
    private static final BigDecimal DEAD_BAND = new BigDecimal("0.6666666667");

    /** The hours of a window in a month. */
    @FunctionalInterface
    public interface WindowHours {
        Optional<BigDecimal> of(MeteredMonth month, String window);
    }

    /** The month with the bank in service. */
    public MeteredMonth with(MeteredMonth month, Estimate estimate) {
        if (bank.ratedKvar().signum() == 0) {
            return month;
        }
        BigDecimal hours = BigDecimal.valueOf(month.period().days()).multiply(HOURS_A_DAY);
        Readings totals = corrected(month.totals(), month.totals(), hours, estimate);
        Map<String, Readings> windows = new TreeMap<>();
        month.windows()
                .forEach((name, readings) -> windows.put(
                        name,
                        windowHours
                                .of(month, name)
                                .map(inWindow -> corrected(readings, month.totals(), inWindow, estimate))
                                .orElse(readings)));
        return month.with(totals).withWindows(windows);
    }

    /** @param whole the whole month's readings, whose peaks bound those of a window that prints none */
    private Readings corrected(Readings before, Readings whole, BigDecimal hours, Estimate estimate) {
        Readings known = completed(before);
        Readings after = known;
        Optional<BigDecimal> lagging = known.get(LAGGING_KVARH);
        if (lagging.isPresent() && hours.signum() > 0) {
            ReactiveMonth load = new ReactiveMonth(lagging.get(), hours, highest(known, whole), likely(known, whole));
            BigDecimal left = laggingLeft(load, known, hours, estimate);
            BigDecimal sent = leadingAfter(load, known.get(LEADING_KVARH).orElse(BigDecimal.ZERO), hours, estimate);
            after = after.with(LAGGING_KVARH, left).with(LEADING_KVARH, sent);
            BigDecimal switched = lagging.get()
                    .subtract(laggingLeft(load, known, hours, estimate.opposite()))
                    .max(BigDecimal.ZERO);
            after = energies(known, after, ownLosses(hours, switched), left, sent);
        }
        return peaks(known, after, estimate);
    }

    /** Fills in what the correction needs and the bill leaves out. */
    private static Readings completed(Readings readings) {
        Readings known = readings;
        for (Derivable derivable : new Derivable[] {Derivable.LAGGING_KVARH, Derivable.PEAK_KVA}) {
            if (!known.has(derivable.register())) {
                Optional<BigDecimal> value = derivable.from(known);
                known = value.isPresent() ? known.with(derivable.register(), value.get()) : known;
            }
        }
        return known;
    }

    private BigDecimal laggingLeft(ReactiveMonth load, Readings known, BigDecimal hours, Estimate estimate) {
        BigDecimal left = load.left(bank.effectiveKvar(), estimate);
        if (!bank.isAutomatic()) {
            return left;
        }
        BigDecimal aim = targetKvarh(known).min(load.laggingKvarh());
        BigDecimal kept = switch (estimate) {
            case LOW -> left.add(aim).add(deadBandKvarh(hours));
            case CENTRAL -> left.max(aim);
            case HIGH -> left;
        };
        BigDecimal withFixedAlone = load.left(bank.effectiveFixedKvar(), estimate);
        return kept.min(withFixedAlone);
    }

    /** What a controller leaves on purpose: the kvarh of the power factor it aims at. */
    private BigDecimal targetKvarh(Readings known) {
        return bank.targetPowerFactor()
                .flatMap(pf -> known.get(ENERGY_KWH).map(kwh -> kwh.multiply(Triangle.tangent(pf))))
                .orElse(BigDecimal.ZERO);
    }

    /** A controller does not answer within two thirds of its smallest step. Common practice, no source. */
    private BigDecimal deadBandKvarh(BigDecimal hours) {
        return bank.smallestStepKvar().multiply(DEAD_BAND).multiply(hours);
    }

    /** Only what is always on sends kvarh back: lagging after − leading after = lagging − leading − c × T. */
    private BigDecimal leadingAfter(ReactiveMonth load, BigDecimal before, BigDecimal hours, Estimate estimate) {
        BigDecimal fixed = bank.effectiveFixedKvar();
        BigDecimal created =
                load.left(fixed, estimate).subtract(load.laggingKvarh()).add(fixed.multiply(hours));
        BigDecimal hunting = estimate == Estimate.LOW ? deadBandKvarh(hours) : BigDecimal.ZERO;
        return before.add(created.max(BigDecimal.ZERO)).add(hunting);
    }

    /** kWh of the bank itself, which is dearest where the steps work most: so least in the high estimate, most in the low. */
    private BigDecimal ownLosses(BigDecimal hours, BigDecimal switchedKvarh) {
        BigDecimal delivered = bank.effectiveFixedKvar().multiply(hours);
        if (bank.isAutomatic()) {
            delivered = delivered.add(switchedKvarh);
        }
        return delivered.multiply(bank.wattsPerKvar()).divide(WATTS_A_KILOWATT, Triangle.PRECISION);
    }

    private static Readings energies(
            Readings known, Readings after, BigDecimal lost, BigDecimal left, BigDecimal sent) {
        Readings result = after;
        Optional<BigDecimal> kwh = known.get(ENERGY_KWH);
        if (kwh.isPresent()) {
            BigDecimal active = kwh.get().add(lost);
            result = result.with(ENERGY_KWH, active);
            if (known.has(POWER_FACTOR) && active.signum() > 0) {
                result = result.with(POWER_FACTOR, Triangle.powerFactor(active, Triangle.apparent(active, left)));
            }
            if (known.has(APPARENT_KVAH)) {
                result = result.with(APPARENT_KVAH, Triangle.apparent(active, left.add(sent)));
            }
        }
        return result;
    }

    private Readings peaks(Readings known, Readings before, Estimate estimate) {
        BigDecimal fixed = bank.effectiveFixedKvar();
        BigDecimal switched = bank.effectiveSwitchedKvar();
        BigDecimal slack = estimate == Estimate.LOW ? bank.smallestStepKvar().multiply(DEAD_BAND) : BigDecimal.ZERO;
        Readings after = before;
        Optional<BigDecimal> kw = known.get(PEAK_KW);
        Optional<BigDecimal> kva = known.get(PEAK_KVA);
        if (kw.isPresent() && kva.isPresent()) {
            BigDecimal apparent = new PeakApparent(kw.get(), kva.get().max(kw.get())).after(fixed, switched, estimate);
            BigDecimal aimed = bank.isAutomatic() && estimate != Estimate.HIGH
                    ? bank.targetPowerFactor()
                            .map(pf -> kw.get().divide(pf, Triangle.PRECISION))
                            .orElse(kw.get())
                    : kw.get();
            BigDecimal reached = apparent.max(aimed).add(slack);
            after = after.with(PEAK_KVA, bank.isAutomatic() && fixed.signum() == 0 ? reached.min(kva.get()) : reached);
        }
        Optional<BigDecimal> kvar = known.get(PEAK_LAGGING_KVAR);
        if (kvar.isPresent()) {
            after = after.with(
                    PEAK_LAGGING_KVAR,
                    kvar.get()
                            .subtract(fixed)
                            .subtract(switched)
                            .add(slack)
                            .max(BigDecimal.ZERO)
                            .min(kvar.get()));
        }
        BigDecimal sent = known.get(PEAK_LEADING_KVAR).orElse(BigDecimal.ZERO);
        return after.with(PEAK_LEADING_KVAR, estimate == Estimate.HIGH ? sent : sent.add(fixed));
    }

    /** A safe upper limit of the lagging kvar: the demand read, else the highest kVA. */
    private static Optional<BigDecimal> highest(Readings window, Readings whole) {
        return first(window, whole, readings -> readings.get(PEAK_LAGGING_KVAR))
                .or(() -> first(window, whole, readings -> readings.get(PEAK_KVA)));
    }

    /** The best guess of the highest lagging kvar: the demand read, else √(kVA² − kW²) as if both peaked together. */
    private static Optional<BigDecimal> likely(Readings window, Readings whole) {
        return first(window, whole, readings -> readings.get(PEAK_LAGGING_KVAR))
                .or(() -> first(window, whole, Derivable.PEAK_LAGGING_KVAR::from))
                .or(() -> first(window, whole, Derivable.PEAK_LAGGING_KVAR_FROM_MONTH::from));
    }

    private static Optional<BigDecimal> first(
            Readings window, Readings whole, Function<Readings, Optional<BigDecimal>> read) {
        return read.apply(window).or(() -> read.apply(whole));
    }
}
