// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/**
 * What a bank saves in the resistance between meter and bank, and nowhere else. Loss is {@code ρ (P² + Q²)} [kW] at constant
 * voltage. Source: I²R; the percentage as in IEEE Std 141, ch. 8 (from memory); the energy form own arithmetic,
 * {@code ∫ρ(q² − (q − c)²) dt}, exact for a constant bank whatever the load did.
 */
public final class SeriesLosses {
    private SeriesLosses() {}

    /**
     * {@code 100 (1 − (PF1/PF2)²)} [% of the losses before the bank, not of the bill], negative if the power factor falls.
     *
     * @throws IllegalArgumentException if a power factor is outside (0, 1]
     */
    public static double cutPercent(double presentPf, double newPf) {
        double ratio = Given.powerFactor("presentPf", presentPf) / Given.powerFactor("newPf", newPf);
        return 100 * (1 - ratio * ratio);
    }

    /**
     * ρ of a transformer, {@code Pk / S_T²} [kW per kVA²].
     *
     * @param loadLossKw Pk at rated current [kW], 0 or more
     * @param transformerKva S_T [kVA], above 0
     */
    public static double perKva2(double loadLossKw, double transformerKva) {
        Given.positive("transformerKva", transformerKva, "kVA");
        return Given.notNegative("loadLossKw", loadLossKw, "kW") / (transformerKva * transformerKva);
    }

    /**
     * Energy saved by a bank always on, {@code ρ (2 c Q − c² T)} [kWh], before the bank's own losses; negative once
     * {@code c > 2 Q / T}.
     *
     * @param perKva2 ρ [kW per kVA²], 0 or more
     * @param bankKvar c [kvar], 0 or more
     * @param netKvarh Q, lagging less leading [kvarh]
     * @param hours T [h], above 0
     */
    public static double savedKwh(double perKva2, double bankKvar, double netKvarh, double hours) {
        Given.notNegative("perKva2", perKva2, "kW per kVA²");
        Given.notNegative("bankKvar", bankKvar, "kvar");
        Given.finite("netKvarh", netKvarh, "kvarh");
        Given.positive("hours", hours, "h");
        return perKva2 * bankKvar * (2 * netKvarh - bankKvar * hours);
    }

    /**
     * What the bank itself turns into heat, {@code w c T / 1000} [kWh].
     *
     * @param wattsPerKvar w, 0 or more; about 0.2 for a film capacitor alone, 0.5 with discharge resistors, 4 to 8 for a whole detuned
     *     bank (from memory); 0.5 to 2.0 in IEEE Std 3001.5-2013, table 1
     */
    public static double ownKwh(double wattsPerKvar, double bankKvar, double hours) {
        return Given.notNegative("wattsPerKvar", wattsPerKvar, "W/kvar")
                * Given.notNegative("bankKvar", bankKvar, "kvar")
                * Given.notNegative("hours", hours, "h")
                / 1000;
    }
}
