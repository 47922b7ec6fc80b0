// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static java.math.MathContext.DECIMAL128;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;

/**
 * What a venture pays and saves, month by month over its life, not rounded.
 *
 * @param months month 0 and twelve for each year of the life
 */
public record CashFlow(List<Month> months) {
    public CashFlow {
        months = List.copyOf(months);
    }

    /** The flow of a venture, by the conventions of {@link Outlook}, {@link Month} and {@link Tax}. */
    public static CashFlow of(Venture venture) {
        Tax tax = new Tax(venture);
        BigDecimal zero = BigDecimal.ZERO;
        List<Month> months = new ArrayList<>();
        months.add(new Month(0, venture.investment().netCost(), zero, zero, zero, zero, zero));
        for (int year = 1; year <= venture.investment().lifeYears(); year++) {
            untaxed(venture, year).forEach(month -> months.add(tax.on(month)));
        }
        return new CashFlow(months);
    }

    private static List<Month> untaxed(Venture venture, int year) {
        Investment investment = venture.investment();
        Outlook outlook = venture.outlook();
        List<BigDecimal> fresh =
                year == 1 ? venture.savings().firstYear() : venture.savings().settledYear();
        BigDecimal growth = BigDecimal.ONE
                .add(outlook.savingsEscalation())
                .multiply(BigDecimal.ONE.subtract(outlook.savingsDegradation()))
                .pow(year - 1, DECIMAL128);
        BigDecimal upkeep = investment
                .yearlyUpkeep()
                .multiply(BigDecimal.ONE.add(outlook.upkeepEscalation()).pow(year - 1, DECIMAL128))
                .divide(BigDecimal.valueOf(12), DECIMAL128);
        BigDecimal replacements = investment.replacements().stream()
                .filter(replacement -> replacement.year() == year)
                .map(Replacement::cost)
                .reduce(BigDecimal.ZERO, BigDecimal::add);
        BigDecimal residual = year == investment.lifeYears() ? investment.residual() : BigDecimal.ZERO;
        List<Month> months = new ArrayList<>();
        for (int place = 1; place <= 12; place++) {
            boolean last = place == 12;
            months.add(new Month(
                    12 * (year - 1) + place,
                    BigDecimal.ZERO,
                    fresh.get(place - 1).multiply(growth, DECIMAL128),
                    upkeep,
                    last ? replacements : BigDecimal.ZERO,
                    last ? residual : BigDecimal.ZERO,
                    BigDecimal.ZERO));
        }
        return months;
    }

    /** Net flow of each month, month 0 first. */
    public List<BigDecimal> monthly() {
        return months.stream().map(Month::net).toList();
    }

    /** Net flow of each year, year 0 (the investment) first; everything within a year counts at its end. */
    public List<BigDecimal> yearly() {
        return yearly(Month::net);
    }

    /** The sum of all flows up to each month, month 0 first. */
    public List<BigDecimal> cumulative() {
        return Recovery.runningSum(monthly());
    }

    /** One part of the flow, summed over each year, year 0 first. */
    List<BigDecimal> yearly(Function<Month, BigDecimal> part) {
        List<BigDecimal> years = new ArrayList<>();
        years.add(part.apply(months.get(0)));
        for (int first = 1; first < months.size(); first += 12) {
            years.add(months.subList(first, first + 12).stream().map(part).reduce(BigDecimal.ZERO, BigDecimal::add));
        }
        return years;
    }
}
