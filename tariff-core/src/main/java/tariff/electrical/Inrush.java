// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/** The current when a discharged capacitor is switched on. */
public final class Inrush {
    /** Most that a low-voltage capacitor should see, crest over rated rms. Source: IEC 60831-1 as quoted by makers. */
    public static final double LIMIT = 100;

    private Inrush() {}

    /**
     * A single bank, crest over rated rms current, {@code √2 h_r}: {@code √(2 S/Q)} without a reactor. Source: closing an LC circuit at
     * the crest of the voltage, own arithmetic.
     *
     * @param shortCircuitKva S at the bus [kVA], above 0
     * @param capacitorKvar Q [kvar], above 0
     * @param reactorP p in [0, 1)
     * @throws IllegalArgumentException outside these ranges
     */
    public static double isolatedTimesRated(double shortCircuitKva, double capacitorKvar, double reactorP) {
        return Math.sqrt(2) * Resonance.order(shortCircuitKva, capacitorKvar, reactorP);
    }

    /** Crest [A] from rms currents, {@code √(2 I_sc I_1)}: fault current at the bus and rated current of the bank [A], above 0. */
    public static double isolatedPeakAmps(double faultAmps, double ratedAmps) {
        return Math.sqrt(2 * Given.positive("faultAmps", faultAmps, "A") * Given.positive("ratedAmps", ratedAmps, "A"));
    }

    /** Frequency of that current [Hz], {@code f √(I_sc / I_1)}. */
    public static double isolatedHertz(double serviceHertz, double faultAmps, double ratedAmps) {
        return Given.positive("serviceHertz", serviceHertz, "Hz")
                * Math.sqrt(Given.positive("faultAmps", faultAmps, "A") / Given.positive("ratedAmps", ratedAmps, "A"));
    }

    /**
     * A bank switched on beside one that is charged, crest [A]: {@code √(2/3) U √(C/L)} with C the two in series. At 60 Hz this is
     * {@code 1750 √(kV I1 I2 / (L (I1 + I2)))}, L in µH; IEEE Std C37.99-1990 prints 1747 (as quoted in formula notes).
     *
     * @param lineVolts U [V], above 0
     * @param firstAmps rated current of the one [A], above 0
     * @param secondAmps rated current of the other [A], above 0
     * @param loopMicrohenries inductance between the two, per phase [µH], above 0
     * @param serviceHertz above 0
     */
    public static double backToBackPeakAmps(
            double lineVolts, double firstAmps, double secondAmps, double loopMicrohenries, double serviceHertz) {
        Given.positive("lineVolts", lineVolts, "V");
        Given.positive("firstAmps", firstAmps, "A");
        Given.positive("secondAmps", secondAmps, "A");
        Given.positive("loopMicrohenries", loopMicrohenries, "µH");
        double omega = 2 * Math.PI * Given.positive("serviceHertz", serviceHertz, "Hz");
        double phaseVolts = lineVolts / Math.sqrt(3);
        double farads = firstAmps * secondAmps / (firstAmps + secondAmps) / (omega * phaseVolts);
        return Math.sqrt(2) * phaseVolts * Math.sqrt(farads / (loopMicrohenries * 1e-6));
    }
}
