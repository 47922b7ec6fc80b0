// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/** Currents that conductors and switches of a bank must carry. */
public final class CapacitorCurrent {
    /** Conductors and disconnects over rated current. Source: NEC (NFPA 70) 460.8(A) and (C), as quoted in EC&amp;M. */
    public static final double NEC_FACTOR = 1.35;

    /** Continuous current over rated. Source: IEC 60831-1:2014 (from memory). */
    public static final double IEC_FACTOR = 1.30;

    /** The same with capacitance at +10 %. Source: IEC 60831-1:2014 (from memory). */
    public static final double IEC_FACTOR_WITH_TOLERANCE = 1.43;

    /** The same with capacitance at +15 %. Source: IEC 60831-1:1996 (from memory). */
    public static final double IEC_FACTOR_1996 = 1.5;

    private CapacitorCurrent() {}

    /**
     * {@code 1000 Q / (√3 U)} [A].
     *
     * @param kvar three-phase [kvar], 0 or more
     * @param lineVolts [V], above 0
     * @throws IllegalArgumentException outside these ranges
     */
    public static double ratedAmps(double kvar, double lineVolts) {
        return 1000
                * Given.notNegative("kvar", kvar, "kvar")
                / (Math.sqrt(3) * Given.positive("lineVolts", lineVolts, "V"));
    }

    /** Least conductor ampacity, 135 % of the rated current [A]. Source: NEC 460.8(A). */
    public static double conductorAmps(double ratedAmps) {
        return NEC_FACTOR * Given.notNegative("ratedAmps", ratedAmps, "A");
    }

    /**
     * Least ampacity where the capacitor hangs on a motor circuit: 135 % of the rated current and a third of the motor conductor's
     * ampacity, whichever is more [A]. Source: NEC 460.8(A).
     */
    public static double motorCircuitConductorAmps(double ratedAmps, double motorConductorAmps) {
        return Math.max(conductorAmps(ratedAmps), Given.notNegative("motorConductorAmps", motorConductorAmps, "A") / 3);
    }
}
