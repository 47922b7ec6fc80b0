// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import static tariff.meter.Register.APPARENT_KVAH;
import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.LAGGING_KVARH;
import static tariff.meter.Register.LEADING_KVARH;
import static tariff.meter.Register.PEAK_KVA;
import static tariff.meter.Register.PEAK_LAGGING_KVAR;
import static tariff.meter.Register.POWER_FACTOR;

import java.math.BigDecimal;
import java.time.ZoneId;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import tariff.meter.Derivable;
import tariff.meter.MeteredMonth;
import tariff.meter.Period;
import tariff.meter.Readings;
import tariff.meter.Triangle;
import tariff.meter.Window;

/**
 * A month as the meter would have shown it with a bank in service. kW and kWh stay as they are but for the bank's own losses; kvarh and kVA
 * move as far as physics allows.
 *
 * <p>A time switch leaves the bank T′ of a period's T hours. The kvarh move in those alone, see {@link ReactiveMonth#during}. The highest
 * kVA and kvar may have fallen while the bank was off: the low estimate leaves them as high as they were, central and high take them to
 * have fallen while it was on. How often a controller may switch is not seen in a month's totals.
 *
 * @param bank the bank
 * @param windows the rate's windows by name; one that is not among them keeps its readings
 * @param zone the clock that windows and months go by
 */
public record BankMonth(CapacitorBank bank, Map<String, Window> windows, ZoneId zone) {
    /** Hours of a period, and those in which the bank may be on. */
    private record Hours(BigDecimal all, BigDecimal on) {
        boolean isInterrupted() {
            return on.compareTo(all) < 0;
        }
    }

    /** kvarh taken from the lagging register, and added to the leading. */
    private record Moved(BigDecimal removed, BigDecimal created) {}

    /** The month with the bank in service. */
    public MeteredMonth with(MeteredMonth month, Estimate estimate) {
        if (bank.ratedKvar().signum() == 0) {
            return month;
        }
        Period period = month.period();
        Readings totals = corrected(month.totals(), month.totals(), hours(period), estimate);
        Map<String, Readings> corrected = new TreeMap<>(month.windows());
        corrected.replaceAll((name, readings) -> {
            @Nullable Window window = windows.get(name);
            return window == null ? readings : corrected(readings, month.totals(), hours(period, window), estimate);
        });
        return month.with(totals).withWindows(corrected);
    }

    private Hours hours(Period period) {
        BigDecimal all = period.hours(zone);
        return hours(all, bank.off().map(off -> off.hoursIn(period, zone)));
    }

    private Hours hours(Period period, Window window) {
        return hours(window.hoursIn(period, zone), bank.off().map(off -> off.hoursIn(period, zone, window)));
    }

    private static Hours hours(BigDecimal all, Optional<BigDecimal> off) {
        return new Hours(all, all.subtract(off.orElse(BigDecimal.ZERO)));
    }

    /** @param whole the whole month's readings, whose peaks bound those of a window that prints none */
    private Readings corrected(Readings before, Readings whole, Hours hours, Estimate estimate) {
        if (hours.on().signum() == 0) {
            return before;
        }
        Readings known = completed(before);
        Readings after = known;
        BigDecimal slack = estimate == Estimate.LOW ? bank.deadBandKvar() : BigDecimal.ZERO;
        Optional<BigDecimal> lagging = known.get(LAGGING_KVARH);
        if (lagging.isPresent()) {
            ReactiveMonth load =
                    new ReactiveMonth(lagging.get(), hours.all(), highest(known, whole), likely(known, whole));
            Moved moved = moved(load, known, hours, estimate, slack);
            BigDecimal left = lagging.get().subtract(moved.removed());
            BigDecimal sent = known.get(LEADING_KVARH).orElse(BigDecimal.ZERO).add(moved.created());
            after = after.with(LAGGING_KVARH, left).with(LEADING_KVARH, sent);
            after = energies(known, after, ownLosses(load, known, hours, estimate, moved), left, sent);
        }
        return new BankPeaks(bank, slack, hours.isInterrupted(), estimate).in(known, after);
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

    /**
     * What the bank takes from the lagging kvarh and adds to the leading. The fixed kvar send back c × T′ less what they remove; what steps
     * leave and send back besides is bounded by their dead band, and likely by the load curve.
     */
    private Moved moved(ReactiveMonth load, Readings known, Hours hours, Estimate estimate, BigDecimal slack) {
        ReactiveMonth on = load.during(hours.on(), estimate);
        BigDecimal fixed = bank.effectiveFixedKvar();
        BigDecimal byFixed = on.left(fixed, estimate);
        BigDecimal created = byFixed.subtract(on.laggingKvarh())
                .add(fixed.multiply(hours.on()))
                .max(BigDecimal.ZERO);
        BigDecimal left = byFixed;
        if (bank.isAutomatic()) {
            left = on.left(bank.effectiveKvar(), estimate);
            if (estimate == Estimate.LOW) {
                BigDecimal deadBand = slack.multiply(hours.on());
                left = left.add(targetKvarh(known).min(on.laggingKvarh())).add(deadBand);
                created = created.add(deadBand);
            } else if (estimate == Estimate.CENTRAL) {
                BigDecimal aim = targetKvarh(known).multiply(hours.on()).divide(hours.all(), Triangle.PRECISION);
                LikelySteps steps = LikelySteps.of(on, bank, aim);
                left = left.max(steps.laggingKvarh());
                created = created.add(steps.sentBackKvarh());
            }
        }
        return new Moved(on.laggingKvarh().subtract(left.min(byFixed)), created);
    }

    /** What a controller leaves on purpose at the most: the kvarh of the power factor it aims at. */
    private BigDecimal targetKvarh(Readings known) {
        return bank.controller()
                .targetPowerFactor()
                .flatMap(pf -> known.get(ENERGY_KWH).map(kwh -> kwh.multiply(Triangle.tangent(pf))))
                .orElse(BigDecimal.ZERO);
    }

    /**
     * kWh of the bank itself. What it delivers is what lags less and what leads more; that is dearest where the steps work most, so the
     * least goes with the high estimate and the most with the low. The fixed kvar deliver while they are on, whatever the load.
     */
    private BigDecimal ownLosses(ReactiveMonth load, Readings known, Hours hours, Estimate estimate, Moved moved) {
        if (bank.wattsPerKvar().signum() == 0) {
            return BigDecimal.ZERO;
        }
        Estimate opposite = estimate.opposite();
        BigDecimal slack = opposite == Estimate.LOW ? bank.deadBandKvar() : BigDecimal.ZERO;
        BigDecimal delivered =
                moved.created().add(moved(load, known, hours, opposite, slack).removed());
        BigDecimal least = bank.effectiveFixedKvar().multiply(hours.on());
        BigDecimal most = bank.effectiveKvar().multiply(hours.on());
        return bank.ownKilowatts(delivered.max(least).min(most));
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
