// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/**
 * Power factor where the current is distorted and the voltage is not: true {@code PF = P/S}, displacement {@code PF1 = P/S1},
 * {@code S² = P² + Q² + D²}, {@code D = S1 THD}. Capacitors take away Q and leave D. Source: IEEE Std 1459-2010 (from memory), and
 * articles on distortion power factor for {@code PF ≈ PF1/√(1 + THD²)}.
 */
public final class Distortion {
    private Distortion() {}

    /**
     * {@code PF1 / √(1 + THD²)}.
     *
     * @param displacementPf PF1 in (0, 1]
     * @param currentThd harmonic over fundamental current, 0 or more
     * @throws IllegalArgumentException outside these ranges
     */
    public static double truePf(double displacementPf, double currentThd) {
        return Given.powerFactor("displacementPf", displacementPf)
                / Math.hypot(1, Given.notNegative("currentThd", currentThd, "of the fundamental"));
    }

    /**
     * The best true power factor that capacitors alone can reach, all Q removed, {@code 1 / √(1 + (THD/PF1)²)}. Lower than
     * {@code truePf(1, THD)}, because removing Q leaves the harmonic current on a smaller fundamental.
     *
     * @param displacementPf before the bank
     * @param currentThd before the bank
     */
    public static double ceiling(double displacementPf, double currentThd) {
        Given.notNegative("currentThd", currentThd, "of the fundamental");
        return 1 / Math.hypot(1, currentThd / Given.powerFactor("displacementPf", displacementPf));
    }

    /** D [kVA] of a load with that fundamental triangle, {@code S1 THD}. */
    public static double kva(PowerTriangle fundamental, double currentThd) {
        return fundamental.apparentKva() * Given.notNegative("currentThd", currentThd, "of the fundamental");
    }

    /** S with the harmonics in it, {@code √(P² + Q² + D²)} [kVA]; D is 0 or more. */
    public static double apparentKva(PowerTriangle fundamental, double distortionKva) {
        return Math.hypot(fundamental.apparentKva(), Given.notNegative("distortionKva", distortionKva, "kVA"));
    }
}
