// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static java.math.MathContext.DECIMAL128;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;

/** Today's worth of flows. */
public final class PresentValue {
    private PresentValue() {}

    /**
     * Σ flow_t ÷ (1 + rate)^t, t from 0: the first flow is today's and is not discounted. Spreadsheets' NPV function discounts its
     * first value by a period; give it the flows from t = 1 and add the first outside.
     *
     * @param rate per period of the flows, above −1
     */
    public static BigDecimal of(List<BigDecimal> flows, BigDecimal rate) {
        BigDecimal growth = BigDecimal.ONE.add(rate);
        BigDecimal value = BigDecimal.ZERO;
        for (int t = flows.size() - 1; t >= 0; t--) {
            value = value.divide(growth, DECIMAL128).add(flows.get(t));
        }
        return value;
    }

    /** Each flow ÷ (1 + rate)^t, t from 0, with the rate per period. */
    public static List<BigDecimal> each(List<BigDecimal> flows, BigDecimal rate) {
        BigDecimal growth = BigDecimal.ONE.add(rate);
        List<BigDecimal> discounted = new ArrayList<>();
        BigDecimal grown = BigDecimal.ONE;
        for (BigDecimal flow : flows) {
            discounted.add(flow.divide(grown, DECIMAL128));
            grown = grown.multiply(growth, DECIMAL128);
        }
        return discounted;
    }

    /** Net present value of yearly flows, each at the end of its year: the figure usually compared. */
    public static Answer<BigDecimal> netOfYears(Venture venture) {
        return netOfYears(CashFlow.of(venture), venture.outlook());
    }

    static Answer<BigDecimal> netOfYears(CashFlow flow, Outlook outlook) {
        return outlook.discounting().map(rate -> of(flow.yearly(), rate));
    }

    /** Net present value of monthly flows, each at the end of its month and at {@link Factors#monthlyRate}. */
    public static Answer<BigDecimal> netOfMonths(Venture venture) {
        return netOfMonths(CashFlow.of(venture), venture.outlook());
    }

    static Answer<BigDecimal> netOfMonths(CashFlow flow, Outlook outlook) {
        return outlook.discounting().map(rate -> of(flow.monthly(), Factors.monthlyRate(rate)));
    }
}
