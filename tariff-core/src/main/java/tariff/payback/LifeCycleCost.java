// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static java.math.MathContext.DECIMAL128;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;

/**
 * Everything one course of action costs over the life, at today's worth, yearly flows at year ends (10 CFR 436.19). The course with
 * the lower total is the cheaper; the difference is the net savings (10 CFR 436.20), equal to the net present value whatever bills
 * are compared.
 *
 * @param capital investment and replacements less residual value
 * @param upkeep of the bank
 * @param tax on what the bank earns
 * @param bills those of the year without the bank, escalated, less what the bank saves of them
 */
public record LifeCycleCost(BigDecimal capital, BigDecimal upkeep, BigDecimal tax, BigDecimal bills) {

    public BigDecimal total() {
        return capital.add(upkeep).add(tax).add(bills);
    }

    /**
     * The course that leaves things as they are.
     *
     * @param yearlyBills of the first year without the bank; they rise with the escalation of savings
     */
    public static Answer<LifeCycleCost> without(Venture venture, BigDecimal yearlyBills) {
        BigDecimal none = BigDecimal.ZERO;
        return venture.outlook()
                .discounting()
                .map(rate ->
                        new LifeCycleCost(none, none, none, PresentValue.of(escalated(venture, yearlyBills), rate)));
    }

    /**
     * The course that puts in the bank.
     *
     * @param yearlyBills of the first year without the bank; they rise with the escalation of savings
     */
    public static Answer<LifeCycleCost> with(Venture venture, BigDecimal yearlyBills) {
        CashFlow flow = CashFlow.of(venture);
        return venture.outlook()
                .discounting()
                .map(rate -> new LifeCycleCost(
                        PresentValue.of(flow.yearly(Month::capital), rate),
                        PresentValue.of(flow.yearly(Month::upkeep), rate),
                        PresentValue.of(flow.yearly(Month::tax), rate),
                        PresentValue.of(escalated(venture, yearlyBills), rate)
                                .subtract(PresentValue.of(flow.yearly(Month::savings), rate))));
    }

    private static List<BigDecimal> escalated(Venture venture, BigDecimal yearlyBills) {
        BigDecimal rise = BigDecimal.ONE.add(venture.outlook().savingsEscalation());
        List<BigDecimal> bills = new ArrayList<>(List.of(BigDecimal.ZERO));
        for (int year = 1; year <= venture.investment().lifeYears(); year++) {
            bills.add(yearlyBills.multiply(rise.pow(year - 1, DECIMAL128)));
        }
        return bills;
    }
}
