// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static java.math.MathContext.DECIMAL128;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;

/**
 * When the running sum of flows has brought the cost back. The sum counts as recovered from −0.5e-9 upward, so that twelfths which do
 * not end in decimals cost no month.
 *
 * @param first the first period at whose end the sum is not negative; 0 if nothing was spent
 * @param lasting the first period from whose end on it never is again; later than {@code first} if a replacement or a month of
 *     higher bills takes the sum below nothing once more
 */
public record Recovery(Answer<Integer> first, Answer<Integer> lasting) {

    /** Over monthly flows, month 0 first. */
    public static Recovery ofMonths(List<BigDecimal> flows) {
        return of(runningSum(flows), "month");
    }

    /** Over yearly flows, year 0 first. */
    public static Recovery ofYears(List<BigDecimal> flows) {
        return of(runningSum(flows), "year");
    }

    /** Over monthly flows brought to today's worth at the discount rate. */
    public static Answer<Recovery> discounted(Venture venture) {
        return discounted(CashFlow.of(venture), venture.outlook());
    }

    static Answer<Recovery> discounted(CashFlow flow, Outlook outlook) {
        return outlook.discounting()
                .map(rate -> ofMonths(PresentValue.each(flow.monthly(), Factors.monthlyRate(rate))));
    }

    /**
     * Years and a fraction until recovery lasts, with the last year's flow taken as even through the year. Discounted flows so
     * interpolated give a slightly later date than {@link LevelPayback}, which discounts within the year too.
     */
    public static Answer<BigDecimal> interpolatedYears(List<BigDecimal> yearlyFlows) {
        List<BigDecimal> sums = runningSum(yearlyFlows);
        return of(sums, "year").lasting().map(year -> {
            if (year == 0) {
                return BigDecimal.ZERO;
            }
            BigDecimal missing = sums.get(year - 1).negate();
            return BigDecimal.valueOf(year - 1).add(missing.divide(yearlyFlows.get(year), DECIMAL128));
        });
    }

    static List<BigDecimal> runningSum(List<BigDecimal> flows) {
        List<BigDecimal> sums = new ArrayList<>();
        BigDecimal sum = BigDecimal.ZERO;
        for (BigDecimal flow : flows) {
            sum = sum.add(flow);
            sums.add(sum);
        }
        return sums;
    }

    private static Recovery of(List<BigDecimal> sums, String period) {
        int first = 0;
        while (first < sums.size() && !recovered(sums.get(first))) {
            first++;
        }
        int lasting = sums.size();
        while (lasting > 0 && recovered(sums.get(lasting - 1))) {
            lasting--;
        }
        String missing = Words.money(sums.get(sums.size() - 1).negate()) + " is still missing at the end of the life";
        if (first == sums.size()) {
            Answer<Integer> never = Answer.notApplicable("the cost is not recovered: " + missing);
            return new Recovery(never, never);
        }
        return new Recovery(
                Answer.known(first),
                lasting < sums.size()
                        ? Answer.known(lasting)
                        : Answer.notApplicable(
                                "the cost is recovered in " + period + " " + first + " but not for good: " + missing));
    }

    private static boolean recovered(BigDecimal sum) {
        return sum.setScale(9, RoundingMode.HALF_DOWN).signum() >= 0;
    }
}
