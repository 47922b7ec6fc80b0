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
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.function.UnaryOperator;
import java.util.stream.Stream;
import tariff.meter.Derivable;
import tariff.meter.MeteredMonth;
import tariff.meter.Readings;
import tariff.meter.Register;
import tariff.meter.Triangle;
import tariff.rate.Rate;
import tariff.rate.clause.Clause;
import tariff.rate.clause.Clause.Allowance;
import tariff.rate.clause.Metered;
import tariff.rate.clause.PowerFactorRule;
import tariff.rate.clause.PowerFactorRule.Leading;
import tariff.rate.clause.Quantity;

/**
 * The point from which on a rate asks no penalty for reactive load, though it may still pay a credit: the highest power factor that one
 * of its clauses names, and the lagging kvarh and kvar that it leaves free. A rate that bills kVA and names no point has none short of
 * unity. Leading kvarh stay as they are metered: no capacitor removes them.
 *
 * @param powerFactor the highest target of any clause; empty if no clause names one
 * @param allowances the free amounts of lagging kvarh or kvar
 * @param billsApparent whether the rate bills kVA or kVAh, which fall all the way to unity
 * @param leading what leading kvarh do to the rate's power factors
 */
public record NoPenaltyPoint(
        Optional<BigDecimal> powerFactor, List<Allowance> allowances, boolean billsApparent, Leading leading) {
    /** Cut off, so that what is shared out never comes to more than the whole. */
    private static final MathContext SHARING = new MathContext(30, RoundingMode.DOWN);

    private static final Set<Register> LAGGING = Set.of(LAGGING_KVARH, PEAK_LAGGING_KVAR);

    static NoPenaltyPoint of(Rate rate) {
        List<Clause> clauses = rate.clauses(Clause.class).toList();
        return new NoPenaltyPoint(
                clauses.stream().map(Clause::target).flatMap(Optional::stream).max(BigDecimal::compareTo),
                clauses.stream()
                        .map(Clause::allowance)
                        .flatMap(Optional::stream)
                        .filter(allowance -> rate.registers(allowance.of()).stream()
                                .anyMatch(each -> LAGGING.contains(each.register())))
                        .distinct()
                        .toList(),
                rate.clauses(Metered.class)
                        .anyMatch(each -> each.register() == PEAK_KVA || each.register() == APPARENT_KVAH),
                leading(rate));
    }

    private static Leading leading(Rate rate) {
        return rate.definition().powerFactors().values().stream()
                .map(PowerFactorRule::leading)
                .filter(each -> each == Leading.ADDED || each == Leading.NETTED)
                .findFirst()
                .orElse(Leading.IGNORED);
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
            there = within(free, allowance.of(), there, billing);
        }
        return inside(month, there, part -> reach(part, billing));
    }

    /** Lowers the lagging registers behind a quantity, each by the same share, until it is no more than is free. */
    private static MeteredMonth within(BigDecimal free, Quantity of, MeteredMonth month, Billing billing) {
        BigDecimal counted =
                of.value(new Reckoning(billing, month, List.of(), 0)).value();
        if (counted.compareTo(free) <= 0) {
            return month;
        }
        MeteredMonth there = month;
        for (Metered metered : billing.rate().registers(of)) {
            if (LAGGING.contains(metered.register())) {
                there = change(
                        there,
                        metered.window(),
                        readings -> readings.get(metered.register())
                                .map(value -> readings.with(
                                        metered.register(), value.multiply(free).divide(counted, SHARING)))
                                .orElse(readings));
            }
        }
        return there;
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
        BigDecimal sent = before.get(LEADING_KVARH).orElse(BigDecimal.ZERO);
        Readings after = before;
        if (before.has(ENERGY_KWH)) {
            BigDecimal kwh = before.get(ENERGY_KWH).orElseThrow();
            BigDecimal kvarh = switch (leading) {
                case ADDED -> kwh.multiply(tangent).subtract(sent).max(BigDecimal.ZERO);
                case NETTED -> kwh.multiply(tangent).add(sent);
                default -> kwh.multiply(tangent);
            };
            after = lowered(after, LAGGING_KVARH, kvarh);
            after = lowered(after, APPARENT_KVAH, kwh.divide(pf, Triangle.PRECISION));
        }
        Optional<BigDecimal> demand = before.get(PEAK_KW).or(() -> Derivable.PEAK_KW.from(before));
        if (demand.isPresent()) {
            BigDecimal kw = demand.get();
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
