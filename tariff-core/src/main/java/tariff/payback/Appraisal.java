// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import java.math.BigDecimal;

/**
 * All measures of a venture side by side, none rounded. Where they disagree the net present value decides.
 *
 * @param flow month by month
 * @param simplePaybackYears cost ÷ settled-year net savings
 * @param payback months until the flow has recovered the cost
 * @param discountedPayback the same at today's worth
 * @param netPresentValue of yearly flows at year ends, as usually compared
 * @param netPresentValueMonthly of monthly flows at month ends; higher when savings are steady, as they come sooner
 * @param internalReturn IRR of yearly flows
 * @param internalReturnMonthly IRR of monthly flows, as an effective yearly rate
 * @param modifiedReturn MIRR of yearly flows, financed and reinvested at the discount rate
 * @param savingsToInvestment SIR
 * @param adjustedReturn AIRR
 * @param annualCost of the bank
 */
public record Appraisal(
        CashFlow flow,
        Answer<BigDecimal> simplePaybackYears,
        Recovery payback,
        Answer<Recovery> discountedPayback,
        Answer<BigDecimal> netPresentValue,
        Answer<BigDecimal> netPresentValueMonthly,
        Answer<BigDecimal> internalReturn,
        Answer<BigDecimal> internalReturnMonthly,
        Answer<BigDecimal> modifiedReturn,
        Answer<BigDecimal> savingsToInvestment,
        Answer<BigDecimal> adjustedReturn,
        Answer<AnnualCost> annualCost) {

    public static Appraisal of(Venture venture) {
        CashFlow flow = CashFlow.of(venture);
        Outlook outlook = venture.outlook();
        Answer<BigDecimal> ratio = SavingsRatio.of(flow, outlook);
        return new Appraisal(
                flow,
                SimplePayback.years(venture),
                Recovery.ofMonths(flow.monthly()),
                Recovery.discounted(flow, outlook),
                PresentValue.netOfYears(flow, outlook),
                PresentValue.netOfMonths(flow, outlook),
                InternalReturn.ofYears(flow.yearly()),
                InternalReturn.ofMonths(flow.monthly()),
                outlook.discounting().flatMap(rate -> ModifiedReturn.of(flow.yearly(), rate, rate)),
                ratio,
                outlook.discounting()
                        .flatMap(rate -> ratio.flatMap(sir -> SavingsRatio.adjustedReturn(
                                sir, rate, venture.investment().lifeYears()))),
                AnnualCost.of(venture, flow));
    }
}
