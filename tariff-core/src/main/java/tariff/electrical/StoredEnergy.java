// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/**
 * What stays in a bank after it is switched off. It can kill. The figures say how much and how fast it should go, never that it has
 * gone: discharge resistors fail open, so absence of voltage is tested, then the units are shorted and earthed.
 */
public final class StoredEnergy {
    private StoredEnergy() {}

    /**
     * Energy of a three-phase bank in service, {@code 1000 Q / (2 ω)} [J]; with every unit left at its crest it would be twice that.
     * Source: own arithmetic, {@code ½ C Σv²}.
     *
     * @param kvar at the voltage in service [kvar], 0 or more
     * @param hertz above 0
     * @throws IllegalArgumentException outside these ranges
     */
    public static double joules(double kvar, double hertz) {
        return 1000 * Given.notNegative("kvar", kvar, "kvar") / (4 * Math.PI * Given.positive("hertz", hertz, "Hz"));
    }

    /**
     * Longest time constant that brings the crest down to a residual in time, {@code t / ln(√2 U / u)} [s].
     *
     * @param ratedVolts U, rms [V], above 0
     * @param residual the limit to meet; its voltage must be below the crest
     */
    public static double longestTimeConstantSeconds(double ratedVolts, Residual residual) {
        double crest = Math.sqrt(2) * Given.positive("ratedVolts", ratedVolts, "V");
        Given.value("ratedVolts", ratedVolts, crest > residual.volts(), "a crest above " + residual.volts() + " V");
        return residual.seconds() / Math.log(crest / residual.volts());
    }

    /**
     * Time until a bank may be connected again, when the crest has fallen to 10 % of the rated voltage,
     * {@code τ ln(√2 / 0.1)} [s]. Source: 10 % as in IEC 60831-1 (from memory) and a bank specification.
     *
     * @param timeConstantSeconds τ of the discharge [s], above 0
     */
    public static double reconnectionSeconds(double timeConstantSeconds) {
        return Given.positive("timeConstantSeconds", timeConstantSeconds, "s") * Math.log(Math.sqrt(2) / 0.1);
    }

    /** How far the voltage must have fallen, and by when. */
    public enum Residual {
        /** NEC 460.6: 50 V in 1 min, low voltage. Source: EC&amp;M. */
        NEC_LOW_VOLTAGE("NEC (NFPA 70) 460.6", 50, 60),
        /** NEC 460.28: 50 V in 5 min above 1000 V. From memory. */
        NEC_OVER_1000_V("NEC (NFPA 70) 460.28", 50, 300),
        /** IEC 60831-1:2014: 75 V in 3 min. From memory. */
        IEC_60831("IEC 60831-1:2014", 75, 180),
        /** IEC 60871-1: 75 V in 10 min, above 1000 V. From memory. */
        IEC_60871("IEC 60871-1", 75, 600);

        private final String edition;
        private final double volts;
        private final double seconds;

        Residual(String edition, double volts, double seconds) {
            this.edition = edition;
            this.volts = volts;
            this.seconds = seconds;
        }

        public String edition() {
            return edition;
        }

        public double volts() {
            return volts;
        }

        public double seconds() {
            return seconds;
        }
    }
}
