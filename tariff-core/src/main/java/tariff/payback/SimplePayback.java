// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static java.math.MathContext.DECIMAL128;

import java.math.BigDecimal;

/** The figure everyone quotes: cost ÷ yearly savings. A rough screen only (10 CFR 436.23). */
public final class SimplePayback {
    private SimplePayback() {}

    /**
     * Years = cost net of incentives ÷ (settled-year savings − first-year upkeep), at first-year prices. No discounting, escalation,
     * ageing, tax, replacement or ratchet; may exceed the life. Nothing if the incentives cover the cost.
     */
    public static Answer<BigDecimal> years(Venture venture) {
        BigDecimal cost = venture.investment().netCost();
        BigDecimal savings = venture.savings().settledYearTotal();
        BigDecimal upkeep = venture.investment().yearlyUpkeep();
        if (savings.signum() <= 0) {
            return Answer.notApplicable("savings are not positive, so the cost is never recovered");
        }
        if (savings.compareTo(upkeep) <= 0) {
            return Answer.notApplicable("a settled year saves " + Words.money(savings) + " and its upkeep costs "
                    + Words.money(upkeep) + ", so the cost is never recovered");
        }
        return Answer.known(cost.max(BigDecimal.ZERO).divide(savings.subtract(upkeep), DECIMAL128));
    }
}
