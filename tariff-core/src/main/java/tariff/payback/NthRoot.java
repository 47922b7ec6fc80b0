// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static java.math.MathContext.DECIMAL128;

import java.math.BigDecimal;

/** Roots of decimals, by Newton's method from the nearest double: two steps double 16 digits to more than 34. */
final class NthRoot {
    private NthRoot() {}

    /** x with x^n = a, for a &gt; 0 within the range of a double and n ≥ 1; relative error below 1e-32. */
    static BigDecimal of(BigDecimal a, int n) {
        BigDecimal root = BigDecimal.valueOf(Math.pow(a.doubleValue(), 1.0 / n));
        for (int step = 0; step < 3; step++) {
            BigDecimal power = root.pow(n - 1, DECIMAL128);
            BigDecimal excess = power.multiply(root).subtract(a);
            root = root.subtract(excess.divide(power.multiply(BigDecimal.valueOf(n)), DECIMAL128), DECIMAL128);
        }
        return root;
    }
}
