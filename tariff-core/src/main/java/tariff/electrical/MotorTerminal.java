// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/**
 * Capacitors switched with a motor. Too many keep a motor that is running down excited, at a voltage that can destroy it. The motor
 * maker's own limit goes before any rule here (NEMA MG 1, part 14, in other words).
 */
public final class MotorTerminal {
    private MotorTerminal() {}

    /**
     * The most that may stay on the terminals, {@code 0.9 √3 U I0 / 1000} [kvar]. Source: 90 % rule, IEC 60831-1 guide (from memory);
     * another handbook allows 85 %.
     *
     * @param lineVolts U [V], above 0
     * @param noLoadAmps I0 [A], above 0
     * @throws IllegalArgumentException outside these ranges
     */
    public static double largestKvar(double lineVolts, double noLoadAmps) {
        return 0.9
                * Math.sqrt(3)
                * Given.positive("lineVolts", lineVolts, "V")
                * Given.positive("noLoadAmps", noLoadAmps, "A")
                / 1000;
    }

    /** A first estimate for one motor or a group, 25 % of the rated kW [kvar]. Source: Electrical Installation Guide 2008, p. L11. */
    public static double estimateKvar(double motorKw) {
        return 0.25 * Given.notNegative("motorKw", motorKw, "kW");
    }

    /**
     * New over old setting of the overload relay where the capacitor is on the motor side of it, {@code PF before / PF after}. Source:
     * Electrical Installation Guide, power factor correction of induction motors; NEC 460.9 (from memory).
     */
    public static double overloadSettingRatio(double pfBefore, double pfAfter) {
        return Given.powerFactor("pfBefore", pfBefore) / Given.powerFactor("pfAfter", pfAfter);
    }
}
