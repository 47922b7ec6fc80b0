// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static java.math.BigDecimal.ONE;
import static java.math.MathContext.DECIMAL128;

import java.math.BigDecimal;

/**
 * Present-worth factors, named as in NIST Handbook 135 and ASTM E917. Rates d (discount) and e (escalation) are fractions per
 * year above −1; n is a whole number of years, 1 or more.
 */
public final class Factors {
    private Factors() {}

    /** Single present value, (1 + d)^−n: today's worth of 1 paid at the end of year n. */
    public static BigDecimal spv(BigDecimal d, int n) {
        return ONE.divide(ONE.add(d).pow(n, DECIMAL128), DECIMAL128);
    }

    /** Uniform present value, (1 − (1 + d)^−n) ÷ d, or n if d = 0: today's worth of 1 at the end of each of n years. */
    public static BigDecimal upv(BigDecimal d, int n) {
        return d.signum() == 0 ? BigDecimal.valueOf(n) : ONE.subtract(spv(d, n)).divide(d, DECIMAL128);
    }

    /**
     * Modified uniform present value UPV*, (1 + e) ÷ (d − e) × (1 − ((1 + e) ÷ (1 + d))^n), or n if d = e: today's worth of n
     * yearly amounts that are 1 at today's prices, so that the first is already 1 + e.
     */
    public static BigDecimal upvEscalating(BigDecimal d, BigDecimal e, int n) {
        return upv(realRate(d, e), n);
    }

    /** Uniform capital recovery, 1 ÷ UPV: the level yearly amount that repays 1 with interest. */
    public static BigDecimal ucr(BigDecimal d, int n) {
        return ONE.divide(upv(d, n), DECIMAL128);
    }

    /** The rate left when inflation is taken out: (1 + nominal) ÷ (1 + inflation) − 1. */
    public static BigDecimal realRate(BigDecimal nominal, BigDecimal inflation) {
        return ONE.add(nominal).divide(ONE.add(inflation), DECIMAL128).subtract(ONE);
    }

    /** (1 + real) × (1 + inflation) − 1. */
    public static BigDecimal nominalRate(BigDecimal real, BigDecimal inflation) {
        return ONE.add(real).multiply(ONE.add(inflation)).subtract(ONE);
    }

    /** The rate per month that compounds to an effective yearly one: (1 + yearly)^(1/12) − 1. */
    public static BigDecimal monthlyRate(BigDecimal yearly) {
        return NthRoot.of(ONE.add(yearly), 12).subtract(ONE);
    }
}
