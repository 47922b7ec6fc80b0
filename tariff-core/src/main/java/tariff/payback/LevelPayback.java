// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static java.math.MathContext.DECIMAL128;

import java.math.BigDecimal;

/** Discounted payback of a level yearly saving, in closed form. */
public final class LevelPayback {
    private LevelPayback() {}

    /**
     * n = −ln(1 − d·I ÷ A) ÷ ln(1 + d), or I ÷ A if d = 0: the years n, not whole, at which A·(1 − (1 + d)^−n) ÷ d = I.
     *
     * @param cost I, 0 or more
     * @param yearlySaving A, net of upkeep
     * @param rate d per year, 0 or more
     * @return to the precision of a double
     */
    public static Answer<BigDecimal> years(BigDecimal cost, BigDecimal yearlySaving, BigDecimal rate) {
        if (yearlySaving.signum() <= 0) {
            return Answer.notApplicable("savings are not positive, so the cost is never recovered");
        }
        if (rate.signum() == 0) {
            return Answer.known(cost.divide(yearlySaving, DECIMAL128));
        }
        BigDecimal interest = cost.multiply(rate);
        if (yearlySaving.compareTo(interest) <= 0) {
            return Answer.notApplicable("the yearly saving of " + Words.money(yearlySaving)
                    + " does not exceed a year's interest of " + Words.money(interest)
                    + " on the cost, so the cost is never recovered");
        }
        double share = interest.divide(yearlySaving, DECIMAL128).doubleValue();
        return Answer.known(BigDecimal.valueOf(-Math.log1p(-share) / Math.log1p(rate.doubleValue())));
    }
}
