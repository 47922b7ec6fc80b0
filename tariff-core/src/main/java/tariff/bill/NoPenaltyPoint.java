// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static tariff.meter.Register.APPARENT_KVAH;
import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.LAGGING_KVARH;
import static tariff.meter.Register.LEADING_KVARH;
import static tariff.meter.Register.PEAK_KVA;
import static tariff.meter.Register.PEAK_KW;
import static tariff.meter.Register.PEAK_LAGGING_KVAR;
import static tariff.meter.Register.POWER_FACTOR;

import java.math.BigDecimal;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.function.UnaryOperator;
import java.util.stream.Stream;
import tariff.meter.MeteredMonth;
import tariff.meter.Readings;
import tariff.meter.Register;
import tariff.meter.Triangle;
import tariff.rate.Rate;
import tariff.rate.clause.Clause;
import tariff.rate.clause.Clause.Allowance;
import tariff.rate.clause.Metered;
import tariff.rate.clause.PowerFactorRule;

/**
 * The point from which on a rate asks no penalty for reactive load, though it may still pay a credit: the highest power factor that one
 * of its clauses names, and the lagging kvarh and kvar that it leaves free. A rate that bills kVA and names no point has none short of
 * unity. Leading kvarh stay as they are metered: no capacitor removes them.
 *
 * @param powerFactor the highest target of any clause; empty if no clause names one
 * @param allowances the free amounts of lagging kvarh or kvar
 * @param billsApparent whether the rate bills kVA or kVAh, which fall all the way to unity
 * @param leadingAdded whether a power factor of the rate adds leading kvarh to lagging ones
 */
public record NoPenaltyPoint(
        Optional<BigDecimal> powerFactor, List<Allowance> allowances, boolean billsApparent, boolean leadingAdded) {
    private static final Set<Register> LAGGING = Set.of(LAGGING_KVARH, PEAK_LAGGING_KVAR);

    static NoPenaltyPoint of(Rate rate) {
        List<Clause> clauses = rate.clauses(Clause.class).toList();
        return new NoPenaltyPoint(
                clauses.stream().map(Clause::target).flatMap(Optional::stream).max(BigDecimal::compareTo),
                clauses.stream()
                        .map(Clause::allowance)
                        .flatMap(Optional::stream)
                        .filter(allowance -> LAGGING.contains(allowance.of().register()))
                        .distinct()
                        .toList(),
                rate.clauses(Metered.class)
                        .anyMatch(each -> each.register() == PEAK_KVA || each.register() == APPARENT_KVAH),
                rate.definition().powerFactors().values().stream()
                        .anyMatch(rule -> rule.leading() == PowerFactorRule.Leading.ADDED));
    }

    /** Whether the rate itself says where penalties end; if not, unity stands in. */
    public boolean named() {
        return powerFactor.isPresent() || !allowances.isEmpty();
    }

    /** In words, for the heading of a column. */
    public String words() {
        Stream<String> target = powerFactor.map(pf -> "power factor " + pf.toPlainString()).stream();
        Stream<String> free = allowances.stream()
                .map(each -> each.of().words() + " up to " + each.free().words());
        String all = String.join(", ", Stream.concat(target, free).distinct().toList());
        return named()
                ? all
                : billsApparent
                        ? "unity (the rate bills kVA and names no other point)"
                        : "none (the rate bills nothing reactive)";
    }

    /** The month as it would have been billed without penalty; a month that is better already stays as it is. */
    MeteredMonth reach(MeteredMonth month, Billing billing) {
        if (!named()) {
            return unity(month);
        }
        MeteredMonth there = powerFactor.isPresent() ? at(powerFactor.get(), month) : month;
        Reckoning facts = new Reckoning(billing, there, List.of(), 0);
        for (Allowance allowance : allowances) {
            BigDecimal free = allowance.free().value(facts).value().max(BigDecimal.ZERO);
            Register register = allowance.of().register();
            there = change(there, allowance.of().window(), readings -> lowered(readings, register, free));
        }
        return inside(month, there, part -> reach(part, billing));
    }

    /** The month at unity: nothing lagging, kVA equal to kW. */
    MeteredMonth unity(MeteredMonth month) {
        return inside(month, at(BigDecimal.ONE, month), this::unity);
    }

    private MeteredMonth at(BigDecimal pf, MeteredMonth month) {
        Map<String, Readings> windows = new TreeMap<>();
        month.windows().forEach((name, readings) -> windows.put(name, at(pf, readings)));
        return month.with(at(pf, month.totals())).withWindows(windows);
    }

    private static MeteredMonth inside(MeteredMonth before, MeteredMonth after, UnaryOperator<MeteredMonth> change) {
        return before.detail()
                .map(detail -> after.withDetail(
                        cut -> detail.each(cut).stream().map(change).toList()))
                .orElse(after);
    }

    private Readings at(BigDecimal pf, Readings before) {
        BigDecimal tangent = Triangle.tangent(pf);
        BigDecimal leading = leadingAdded ? before.get(LEADING_KVARH).orElse(BigDecimal.ZERO) : BigDecimal.ZERO;
        Readings after = before;
        if (before.has(ENERGY_KWH)) {
            BigDecimal kwh = before.get(ENERGY_KWH).orElseThrow();
            BigDecimal kvarh = kwh.multiply(tangent).subtract(leading).max(BigDecimal.ZERO);
            after = lowered(after, LAGGING_KVARH, kvarh);
            after = lowered(after, APPARENT_KVAH, kwh.divide(pf, Triangle.PRECISION));
        }
        if (before.has(PEAK_KW)) {
            BigDecimal kw = before.get(PEAK_KW).orElseThrow();
            after = lowered(after, PEAK_KVA, kw.divide(pf, Triangle.PRECISION));
            after = lowered(after, PEAK_LAGGING_KVAR, kw.multiply(tangent));
        }
        Optional<BigDecimal> printed = before.get(POWER_FACTOR);
        return printed.isPresent() ? after.with(POWER_FACTOR, printed.get().max(pf)) : after;
    }

    private static Readings lowered(Readings readings, Register register, BigDecimal to) {
        return readings.get(register)
                .filter(value -> value.compareTo(to) > 0)
                .map(value -> readings.with(register, to))
                .orElse(readings);
    }

    private static MeteredMonth change(MeteredMonth month, Optional<String> window, UnaryOperator<Readings> change) {
        if (window.isEmpty()) {
            return month.with(change.apply(month.totals()));
        }
        Readings readings = month.windows().getOrDefault(window.get(), Readings.none());
        return month.withWindow(window.get(), change.apply(readings));
    }
}
