// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/**
 * How heat and voltage shorten a capacitor's life, as multiples of the life at rated conditions. Source: 10 K and exponent 9 as in a
 * note quoting a maker, {@code (230/253)⁹ = 42 %}; others use 7 to 8 K and exponents from 7.
 */
public final class Life {
    private static final double HALVING_KELVIN = 10;
    private static final double VOLTAGE_EXPONENT = 9;

    private Life() {}

    /**
     * {@code 2^(−ΔT/10)}.
     *
     * @param kelvinAboveRated ΔT, negative where cooler [K]
     * @throws IllegalArgumentException if it is not a number
     */
    public static double temperatureFactor(double kelvinAboveRated) {
        return Math.pow(2, -Given.finite("kelvinAboveRated", kelvinAboveRated, "K") / HALVING_KELVIN);
    }

    /**
     * {@code (U/Un)^−9}.
     *
     * @param voltageRatio voltage across the capacitor over its rated voltage, above 0
     */
    public static double voltageFactor(double voltageRatio) {
        return Math.pow(Given.positive("voltageRatio", voltageRatio, "of rated voltage"), -VOLTAGE_EXPONENT);
    }
}
