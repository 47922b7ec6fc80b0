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
        for (int number = 1; number <= 12 * venture.investment().lifeYears(); number++) {
            months.add(tax.on(untaxed(venture, number)));
        }
        return new CashFlow(months);
    }

    private static Month untaxed(Venture venture, int number) {
        Investment investment = venture.investment();
        Outlook outlook = venture.outlook();
        int year = (number - 1) / 12 + 1;
        int place = (number - 1) % 12;
        List<BigDecimal> fresh =
                year == 1 ? venture.savings().firstYear() : venture.savings().settledYear();
        BigDecimal yearly = BigDecimal.ONE
                .add(outlook.savingsEscalation())
                .multiply(BigDecimal.ONE.subtract(outlook.savingsDegradation()));
        BigDecimal savings = fresh.get(place).multiply(yearly.pow(year - 1, DECIMAL128), DECIMAL128);
        BigDecimal upkeep = investment
                .yearlyUpkeep()
                .multiply(BigDecimal.ONE.add(outlook.upkeepEscalation()).pow(year - 1, DECIMAL128))
                .divide(BigDecimal.valueOf(12), DECIMAL128);
        BigDecimal replacements = investment.replacements().stream()
                .filter(replacement -> number == 12 * replacement.year())
                .map(Replacement::cost)
                .reduce(BigDecimal.ZERO, BigDecimal::add);
        BigDecimal residual = number == 12 * investment.lifeYears() ? investment.residual() : BigDecimal.ZERO;
        return new Month(number, BigDecimal.ZERO, savings, upkeep, replacements, residual, BigDecimal.ZERO);
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
