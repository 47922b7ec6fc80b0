// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import java.math.BigDecimal;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import tariff.meter.Derivable;
import tariff.meter.MeteredMonth;
import tariff.meter.Register;
import tariff.meter.Triangle;
import tariff.rate.Rate;
import tariff.rate.clause.Figure;
import tariff.rate.clause.Metered;
import tariff.rate.clause.MissingReading;
import tariff.rate.clause.PowerFactorRule;
import tariff.rate.clause.PowerFactorRule.From;
import tariff.rate.clause.PowerFactorRule.Leading;

/**
 * One month's bill as a function of how much better its power factors are. Where the rate looks back, the months before are taken to have
 * been as much better, so that a ratchet hides nothing.
 */
final class MonthCurve {
    private static final BigDecimal HOURS_A_DAY = BigDecimal.valueOf(24);

    private final BetterYear year;
    private final int place;
    private final PowerFactorRule stated;
    private final Map<BigDecimal, BigDecimal> known = new HashMap<>();

    /** @param place of the month in its year */
    MonthCurve(BetterYear year, int place) {
        this.year = year;
        this.place = place;
        this.stated = stated(year.billing().rate());
    }

    /** The rate's first power factor, not rounded; without one, that of what the rate bills. */
    private static PowerFactorRule stated(Rate rate) {
        Optional<PowerFactorRule> first =
                rate.definition().powerFactors().values().stream().findFirst();
        From from = bills(rate, Register.PEAK_KVA)
                ? From.PEAK
                : bills(rate, Register.APPARENT_KVAH) ? From.APPARENT : From.ENERGIES;
        return first.map(rule -> new PowerFactorRule(rule.from(), rule.window(), rule.leading(), Optional.empty()))
                .orElse(new PowerFactorRule(from, Optional.empty(), Leading.IGNORED, Optional.empty()));
    }

    private static boolean bills(Rate rate, Register register) {
        return rate.clauses(Metered.class).anyMatch(each -> each.register() == register);
    }

    /** The bill with every power factor better by so much. */
    BigDecimal bill(BigDecimal by) {
        return known.computeIfAbsent(by.stripTrailingZeros(), each -> year.bill(place, each));
    }

    /** How far the month can be bettered. */
    BigDecimal room() {
        return year.room(place);
    }

    /** The power factor that the rate looks at, not rounded; empty if the month has none. */
    Optional<BigDecimal> powerFactor(BigDecimal by) {
        Reckoning facts = new Reckoning(year.billing(), year.month(place, by), List.of(), 0);
        try {
            return stated.value(facts).map(Figure::value);
        } catch (MissingReading missing) {
            return Optional.empty();
        }
    }

    /**
     * What capacitors must give for it: P × (tan φ₁ − tan φ₂) at the highest kW, or at the month's mean kW where no peak is known. The
     * identity that every capacitor table rests on.
     */
    Optional<BigDecimal> kvar(BigDecimal by) {
        return activeKw()
                .flatMap(kw -> powerFactor(BigDecimal.ZERO)
                        .flatMap(from -> powerFactor(by)
                                .map(to -> kw.multiply(Triangle.tangent(from).subtract(Triangle.tangent(to))))));
    }

    private Optional<BigDecimal> activeKw() {
        MeteredMonth month = year.month(place, BigDecimal.ZERO);
        BigDecimal hours = BigDecimal.valueOf(month.period().days()).multiply(HOURS_A_DAY);
        return Stream.of(
                        month.totals().get(Register.PEAK_KW),
                        Derivable.PEAK_KW.from(month.totals()),
                        month.totals().get(Register.ENERGY_KWH).map(kwh -> kwh.divide(hours, Triangle.PRECISION)))
                .flatMap(Optional::stream)
                .findFirst();
    }
}
