// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static java.math.MathContext.DECIMAL128;

import java.math.BigDecimal;

/**
 * What a bank costs as a level amount at the end of each year of its life, by capital recovery ({@link Factors#ucr}), before tax.
 * Divide by kvar for a yearly price of reactive power.
 *
 * @param investment of the cost net of incentives alone
 * @param everything also of replacements and upkeep, less the residual value
 */
public record AnnualCost(BigDecimal investment, BigDecimal everything) {

    public static Answer<AnnualCost> of(Venture venture) {
        return of(venture, CashFlow.of(venture));
    }

    static Answer<AnnualCost> of(Venture venture, CashFlow flow) {
        Investment bank = venture.investment();
        return venture.outlook().discounting().map(rate -> {
            BigDecimal recovery = Factors.ucr(rate, bank.lifeYears());
            BigDecimal present =
                    PresentValue.of(flow.yearly(month -> month.capital().add(month.upkeep())), rate);
            return new AnnualCost(
                    bank.netCost().multiply(recovery, DECIMAL128), present.multiply(recovery, DECIMAL128));
        });
    }
}
