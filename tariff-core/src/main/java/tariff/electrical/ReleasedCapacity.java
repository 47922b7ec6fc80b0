// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/**
 * The kVA that a better power factor sets free in the transformer and cables before the bank. Source: IEEE Std 141, ch. 8 (from
 * memory); check values own arithmetic.
 */
public final class ReleasedCapacity {
    private ReleasedCapacity() {}

    /**
     * With the same load, {@code P (1/PF1 − 1/PF2)} [kVA], negative if the power factor falls.
     *
     * @throws IllegalArgumentException if P is negative or a power factor is outside (0, 1]
     */
    public static double kva(double activeKw, double presentPf, double newPf) {
        return Given.notNegative("activeKw", activeKw, "kW")
                * (1 / Given.powerFactor("presentPf", presentPf) - 1 / Given.powerFactor("newPf", newPf));
    }

    /**
     * All the load of the same power factor that fits into the kVA used before, {@code L = c sin φ + √(S² − c² cos² φ)} [kVA]; L − S
     * is the extra load.
     *
     * @param presentKva S before the bank [kVA], above 0
     * @param powerFactor cos φ of old and new load, in (0, 1]
     * @param bankKvar c [kvar], in [0, S]
     */
    public static double loadThatFitsKva(double presentKva, double powerFactor, double bankKvar) {
        Given.positive("presentKva", presentKva, "kVA");
        Given.powerFactor("powerFactor", powerFactor);
        Given.value("bankKvar", bankKvar, bankKvar >= 0 && bankKvar <= presentKva, "0 kvar up to presentKva");
        double sine = Math.sqrt((1 - powerFactor) * (1 + powerFactor));
        double across = bankKvar * powerFactor;
        return bankKvar * sine + Math.sqrt(presentKva * presentKva - across * across);
    }
}
