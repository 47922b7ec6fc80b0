// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/**
 * Active and reactive power at one moment, and what follows from them: {@code S² = P² + Q²}, {@code PF = P / S = cos φ},
 * {@code tan φ = Q / P}. Source: universal definitions for sinusoidal quantities, IEEE Std 1459-2010 (from memory).
 *
 * @param activeKw P [kW], 0 or more
 * @param reactiveKvar Q [kvar], lagging positive, leading negative
 */
public record PowerTriangle(double activeKw, double reactiveKvar) {

    /** Which way the reactive power goes. */
    public enum Side {
        LAGGING,
        UNITY,
        LEADING
    }

    /** Refuses a negative P, and what is not a number, with an {@link IllegalArgumentException}. */
    public PowerTriangle {
        Given.notNegative("activeKw", activeKw, "kW");
        Given.finite("reactiveKvar", reactiveKvar, "kvar");
    }

    /**
     * A load of known active power and lagging power factor, {@code Q = P tan φ}.
     *
     * @param powerFactor cos φ, in (0, 1]
     * @throws IllegalArgumentException outside these ranges
     */
    public static PowerTriangle lagging(double activeKw, double powerFactor) {
        return new PowerTriangle(activeKw, activeKw * tanPhi(powerFactor));
    }

    /**
     * Reactive per active power, {@code tan φ = √(1 − PF²) / PF}: kvar per kW, or kvarh per kWh.
     *
     * @param powerFactor cos φ, in (0, 1]
     * @throws IllegalArgumentException outside that range
     */
    public static double tanPhi(double powerFactor) {
        Given.powerFactor("powerFactor", powerFactor);
        return Math.sqrt((1 - powerFactor) * (1 + powerFactor)) / powerFactor;
    }

    /**
     * The power factor of a given reactive share, {@code cos φ = 1 / √(1 + tan² φ)}, the same for either sign.
     *
     * @param tanPhi kvar per kW
     */
    public static double cosPhi(double tanPhi) {
        return 1 / Math.hypot(1, Given.finite("tanPhi", tanPhi, "kvar per kW"));
    }

    /**
     * The bank that lifts a load from one lagging power factor to another, {@code Qc = P (tan φ1 − tan φ2)} [kvar], 0 if the
     * target is already met.
     *
     * @throws IllegalArgumentException if P is negative or a power factor is outside (0, 1]
     */
    public static double kvarBetween(double activeKw, double presentPf, double targetPf) {
        Given.notNegative("activeKw", activeKw, "kW");
        Given.powerFactor("presentPf", presentPf);
        Given.powerFactor("targetPf", targetPf);
        return Math.max(0, activeKw * (tanPhi(presentPf) - tanPhi(targetPf)));
    }

    /** S [kVA]. */
    public double apparentKva() {
        return Math.hypot(activeKw, reactiveKvar);
    }

    /** P / S, in [0, 1], without the side; 1 where nothing flows. */
    public double powerFactor() {
        return apparentKva() == 0 ? 1 : activeKw / apparentKva();
    }

    public Side side() {
        return reactiveKvar > 0 ? Side.LAGGING : reactiveKvar < 0 ? Side.LEADING : Side.UNITY;
    }

    /**
     * The same load with a bank beside it: Q less the bank's kvar, leading if that is negative.
     *
     * @param bankKvar effective at the service voltage [kvar], 0 or more
     */
    public PowerTriangle withBank(double bankKvar) {
        return new PowerTriangle(activeKw, reactiveKvar - Given.notNegative("bankKvar", bankKvar, "kvar"));
    }

    /**
     * Line current of a balanced three-phase load, {@code I = 1000 S / (√3 U)} [A].
     *
     * @param lineVolts U between lines [V], above 0
     */
    public double lineAmps(double lineVolts) {
        return 1000 * apparentKva() / (Math.sqrt(3) * Given.positive("lineVolts", lineVolts, "V"));
    }
}
