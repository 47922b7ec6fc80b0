// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/**
 * Square roots to 40 digits, several times quicker than by {@link BigDecimal#sqrt}: a double gives the first 16, and two of Newton's
 * steps, x + (n − x²) ÷ 2x, double them twice. A root of at most 16 digits comes out exact. Own derivation.
 */
final class SquareRoot {
    private static final MathContext FIRST = new MathContext(20, RoundingMode.HALF_EVEN);
    private static final MathContext SECOND = new MathContext(12, RoundingMode.HALF_EVEN);
    private static final MathContext RESULT = new MathContext(40, RoundingMode.HALF_EVEN);

    /** Within these a double keeps its 16 digits through the square. */
    private static final double LEAST = 1e-100;

    private static final double MOST = 1e100;

    private SquareRoot() {}

    /** √n for n ≥ 0. */
    static BigDecimal of(BigDecimal n) {
        double near = near(n);
        if (near < LEAST || near > MOST) {
            return n.sqrt(RESULT);
        }
        BigDecimal root = BigDecimal.valueOf(Math.sqrt(near));
        BigDecimal rest = n.subtract(root.multiply(root));
        if (rest.signum() == 0) {
            return root;
        }
        BigDecimal closer = root.add(rest.divide(root.add(root), FIRST));
        BigDecimal last = n.subtract(closer.multiply(closer));
        return closer.add(last.divide(closer.add(closer), SECOND)).round(RESULT);
    }

    /** The first 15 digits; {@link BigDecimal#doubleValue} would go through text. */
    private static double near(BigDecimal n) {
        return n.unscaledValue().doubleValue() * StrictMath.pow(10, -n.scale());
    }
}
