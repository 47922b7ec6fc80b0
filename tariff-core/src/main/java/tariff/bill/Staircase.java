// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import tariff.meter.MeteredMonth;
import tariff.notice.Refusal;

/**
 * What a better power factor buys from where a month stands: a slope or a staircase, and where it flattens. Where the rate looks back, the
 * months before are taken to have been as much better.
 *
 * @param powerFactor the one the rate looks at, not rounded; empty if the month has none
 * @param nextPoint what the next 0.01 of power factor takes off the bill; below zero if the bill rises
 * @param nextStep the first place ahead where the bill jumps; empty if it does nowhere
 * @param flat where the last saving is had; empty if reactive load costs nothing
 */
public record Staircase(
        Optional<BigDecimal> powerFactor, BigDecimal nextPoint, Optional<Step> nextStep, Optional<Place> flat) {
    private static final BigDecimal POINT = new BigDecimal("0.01");

    /**
     * A place ahead.
     *
     * @param improvement how much better than today; 0 where anything better is enough
     * @param powerFactor there, as the rate looks at it, not rounded; empty if the month has none
     * @param kvar P × (tan φ₁ − tan φ₂) at the highest kW, what takes the load there; empty without kW and power factor
     */
    public record Place(BigDecimal improvement, Optional<BigDecimal> powerFactor, Optional<BigDecimal> kvar) {

        static Place at(MonthCurve curve, BigDecimal improvement) {
            return new Place(
                    improvement,
                    curve.powerFactor(improvement),
                    curve.kvar(improvement).map(kvar -> kvar.setScale(2, RoundingMode.UP)));
        }
    }

    /**
     * A jump of the bill.
     *
     * @param at where
     * @param beyond whether the place must be exceeded; else reaching it is enough
     * @param saving what the jump alone takes off the bill; below zero if the bill jumps up
     */
    public record Step(Place at, boolean beyond, BigDecimal saving) {}

    /**
     * One for each month.
     *
     * @param past earlier months that are not looked at, the earliest first
     * @param months in order
     * @throws Refusal naming a month that lacks what the rate bills
     */
    public static List<Staircase> of(Billing billing, List<MeteredMonth> past, List<MeteredMonth> months) {
        BetterYear all = new BetterYear(
                billing, Stream.concat(past.stream(), months.stream()).toList());
        return IntStream.range(past.size(), past.size() + months.size())
                .mapToObj(place -> of(new MonthCurve(all, place)))
                .toList();
    }

    private static Staircase of(MonthCurve curve) {
        Ahead ahead = new Ahead(curve);
        return new Staircase(
                curve.powerFactor(BigDecimal.ZERO),
                curve.bill(BigDecimal.ZERO).subtract(curve.bill(POINT)),
                ahead.nextStep(),
                ahead.flat());
    }
}
