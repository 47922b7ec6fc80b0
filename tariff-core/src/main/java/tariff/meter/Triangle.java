// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/**
 * The power triangle in decimals, for figures that end up on a bill: S² = P² + Q², PF = P ÷ S. Holds alike for kW, kvar, kVA and for
 * kWh, kvarh, kVAh.
 */
public final class Triangle {
    /** For divisions and roots; wider than any bill, so that what a rate rounds is never decided by it. */
    public static final MathContext PRECISION = MathContext.DECIMAL128;

    /** Beyond any meter: a power factor this near to one of so many decimals is that one. */
    private static final int POWER_FACTOR_DECIMALS = 20;

    private static final BigDecimal NEAR = new BigDecimal("1e-28");

    private Triangle() {}

    /** √(active² + reactive²), the apparent side; 40 digits. */
    public static BigDecimal apparent(BigDecimal active, BigDecimal reactive) {
        if (reactive.signum() == 0) {
            return active.abs();
        }
        return SquareRoot.of(active.multiply(active).add(reactive.multiply(reactive)));
    }

    /**
     * active ÷ apparent to 34 digits, so that kW × 0.95 ÷ (kW ÷ kVA) is still 0.95 kVA to the cent; one that is exactly 0.8 does not
     * become 0.7999… on the way through a root.
     *
     * @param apparent above zero
     */
    public static BigDecimal powerFactor(BigDecimal active, BigDecimal apparent) {
        BigDecimal exact = active.divide(apparent, PRECISION);
        BigDecimal near = exact.setScale(POWER_FACTOR_DECIMALS, RoundingMode.HALF_UP);
        return exact.subtract(near).abs().compareTo(NEAR) < 0 ? near : exact;
    }

    /** √(apparent² − active²), or zero where the apparent side is the smaller one. */
    public static BigDecimal reactive(BigDecimal active, BigDecimal apparent) {
        BigDecimal square = apparent.multiply(apparent).subtract(active.multiply(active));
        return square.signum() <= 0 ? BigDecimal.ZERO : SquareRoot.of(square);
    }

    /**
     * tan φ = √(1 − PF²) ÷ PF, the kvarh for each kWh.
     *
     * @param powerFactor in (0, 1]
     */
    public static BigDecimal tangent(BigDecimal powerFactor) {
        return reactive(powerFactor, BigDecimal.ONE).divide(powerFactor, PRECISION);
    }
}
