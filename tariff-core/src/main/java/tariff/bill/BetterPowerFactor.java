// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static tariff.meter.Register.APPARENT_KVAH;
import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.LAGGING_KVARH;
import static tariff.meter.Register.LEADING_KVARH;
import static tariff.meter.Register.PEAK_KVA;
import static tariff.meter.Register.PEAK_LAGGING_KVAR;
import static tariff.meter.Register.POWER_FACTOR;

import java.math.BigDecimal;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.Stream;
import tariff.meter.Cut;
import tariff.meter.Derivable;
import tariff.meter.MeteredMonth;
import tariff.meter.Readings;
import tariff.meter.Register;
import tariff.meter.Triangle;
import tariff.rate.Rate;
import tariff.rate.clause.PowerFactorRule.Leading;

/**
 * A month as the meter would have shown it with every power factor better by so much, unity at most: that of the energies, of kWh and kVAh,
 * of the highest kW and kVA, of the highest kW and kvar, and the printed one, over the whole period, in each window and in each hour. kWh, kW and
 * everything leading stay.
 *
 * @param leading what leading kvarh do to the rate's power factors
 */
record BetterPowerFactor(Leading leading) {

    /** What a rate's first power factor that counts leading kvarh does with them. */
    static BetterPowerFactor under(Rate rate) {
        return new BetterPowerFactor(rate.definition().powerFactors().values().stream()
                .map(rule -> rule.leading())
                .filter(each -> each != Leading.IGNORED)
                .findFirst()
                .orElse(Leading.IGNORED));
    }

    /**
     * The month so much better.
     *
     * @param by 0 or more; 0.01 is one point
     */
    MeteredMonth month(MeteredMonth month, BigDecimal by) {
        if (by.signum() == 0) {
            return month;
        }
        Map<String, Readings> windows = new TreeMap<>();
        month.windows().forEach((name, readings) -> windows.put(name, better(readings, by)));
        MeteredMonth after = month.with(better(month.totals(), by)).withWindows(windows);
        return month.detail()
                .map(detail -> after.withDetail(new BetterHours(detail, this, by)))
                .orElse(after);
    }

    /** The improvement that takes the last power factor of the month to unity, 0 if all are there. */
    BigDecimal room(MeteredMonth month) {
        BigDecimal room = Stream.concat(Stream.of(month.totals()), month.windows().values().stream())
                .flatMap(this::powerFactors)
                .map(BigDecimal.ONE::subtract)
                .reduce(BigDecimal.ZERO, BigDecimal::max);
        return month.detail().stream()
                .flatMap(detail -> detail.each(Cut.HOURS).stream())
                .map(this::room)
                .reduce(room, BigDecimal::max);
    }

    private Stream<BigDecimal> powerFactors(Readings readings) {
        Optional<BigDecimal> kwh = readings.get(ENERGY_KWH);
        Optional<BigDecimal> kw = peakKw(readings);
        return Stream.of(
                        reactive(kwh, counted(readings)),
                        apparent(kwh, readings.get(APPARENT_KVAH)),
                        apparent(kw, readings.get(PEAK_KVA)),
                        reactive(kw, readings.get(PEAK_LAGGING_KVAR)),
                        readings.get(POWER_FACTOR))
                .flatMap(Optional::stream);
    }

    private Readings better(Readings before, BigDecimal by) {
        Optional<BigDecimal> kwh = before.get(ENERGY_KWH);
        Optional<BigDecimal> kw = peakKw(before);
        Readings after = before;
        after = with(
                after,
                LAGGING_KVARH,
                reactive(kwh, counted(before))
                        .map(pf -> kwh.orElseThrow()
                                .multiply(Triangle.tangent(raised(pf, by)))
                                .subtract(sent(before))
                                .max(BigDecimal.ZERO)));
        after = with(after, APPARENT_KVAH, lowered(kwh, before.get(APPARENT_KVAH), by));
        after = with(after, PEAK_KVA, lowered(kw, before.get(PEAK_KVA), by));
        after = with(
                after,
                PEAK_LAGGING_KVAR,
                reactive(kw, before.get(PEAK_LAGGING_KVAR))
                        .map(pf -> kw.orElseThrow().multiply(Triangle.tangent(raised(pf, by)))));
        return with(after, POWER_FACTOR, before.get(POWER_FACTOR).map(pf -> raised(pf, by)));
    }

    private static Optional<BigDecimal> lowered(
            Optional<BigDecimal> active, Optional<BigDecimal> apparent, BigDecimal by) {
        return apparent(active, apparent).map(pf -> active.orElseThrow().divide(raised(pf, by), Triangle.PRECISION));
    }

    /** The lagging kvarh that the power factor sees; empty if none are read. */
    private Optional<BigDecimal> counted(Readings readings) {
        return readings.get(LAGGING_KVARH).map(lagging -> lagging.add(sent(readings)));
    }

    private BigDecimal sent(Readings readings) {
        BigDecimal kvarh = readings.get(LEADING_KVARH).orElse(BigDecimal.ZERO);
        return switch (leading) {
            case ADDED -> kvarh;
            case NETTED -> kvarh.negate();
            case IGNORED, LARGER -> BigDecimal.ZERO;
        };
    }

    private static Optional<BigDecimal> peakKw(Readings readings) {
        return readings.get(Register.PEAK_KW).or(() -> Derivable.PEAK_KW.from(readings));
    }

    /** Power factor of the two, where something is left to better. */
    private static Optional<BigDecimal> reactive(Optional<BigDecimal> active, Optional<BigDecimal> reactive) {
        return apparent(
                active, active.flatMap(p -> reactive.filter(q -> q.signum() > 0).map(q -> Triangle.apparent(p, q))));
    }

    private static Optional<BigDecimal> apparent(Optional<BigDecimal> active, Optional<BigDecimal> apparent) {
        return active.filter(p -> p.signum() > 0)
                .flatMap(p -> apparent.filter(s -> s.compareTo(p) > 0).map(s -> Triangle.powerFactor(p, s)));
    }

    private static BigDecimal raised(BigDecimal powerFactor, BigDecimal by) {
        return powerFactor.add(by).min(BigDecimal.ONE);
    }

    private static Readings with(Readings readings, Register register, Optional<BigDecimal> value) {
        return value.map(each -> readings.with(register, each)).orElse(readings);
    }
}
