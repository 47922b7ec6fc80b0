// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/**
 * Microfarads per phase of a three-phase bank, from {@code Q = 3 U² ω C} in delta and {@code Q = U² ω C} in star. Source: Gönen,
 * Electric Power Distribution System Engineering, ch. 8, worked example p. 393.
 */
public final class Capacitance {
    private Capacitance() {}

    /**
     * In delta [µF per phase].
     *
     * @param kvar three-phase [kvar], 0 or more
     * @param lineVolts between lines [V], above 0
     * @param hertz above 0
     * @throws IllegalArgumentException outside these ranges
     */
    public static double deltaMicrofarads(double kvar, double lineVolts, double hertz) {
        return starMicrofarads(kvar, lineVolts, hertz) / 3;
    }

    /** In star [µF per phase], three times the delta value. */
    public static double starMicrofarads(double kvar, double lineVolts, double hertz) {
        double omega = 2 * Math.PI * Given.positive("hertz", hertz, "Hz");
        double volts = Given.positive("lineVolts", lineVolts, "V");
        return Given.notNegative("kvar", kvar, "kvar") * 1e9 / (omega * volts * volts);
    }
}
