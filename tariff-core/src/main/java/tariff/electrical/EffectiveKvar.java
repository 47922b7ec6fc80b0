// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/**
 * What a capacitor gives away from its rated voltage and frequency, and behind a reactor:
 * {@code Q = Qr (U/Ur)² (f/fr) / (1 − p)}. Source: square law, IEEE Std 1036-2010 and IEC 60831-1 (from memory); the division by
 * {@code 1 − p} from the series circuit (own arithmetic: the branch reactance is {@code Xc (1 − p)}).
 */
public final class EffectiveKvar {
    private EffectiveKvar() {}

    /**
     * At the rated frequency.
     *
     * @param ratedKvar Qr of the bare capacitor [kvar], 0 or more
     * @param volts U between lines at the bus [V], above 0
     * @param ratedVolts Ur of the bare capacitor [V], above 0
     * @param reactorP series reactor's reactance over the capacitor's at the service frequency, in [0, 1); 0 for none
     * @return kvar at the bus
     * @throws IllegalArgumentException outside these ranges
     */
    public static double of(double ratedKvar, double volts, double ratedVolts, double reactorP) {
        Given.notNegative("ratedKvar", ratedKvar, "kvar");
        double ratio = Given.positive("volts", volts, "V") / Given.positive("ratedVolts", ratedVolts, "V");
        return ratedKvar * ratio * ratio / (1 - Given.reactorP(reactorP));
    }

    /**
     * At another frequency than the rated one, {@code of(…) × f / fr}; p is meant at f.
     *
     * @param hertz f [Hz], above 0
     * @param ratedHertz fr [Hz], above 0
     */
    public static double of(
            double ratedKvar, double volts, double ratedVolts, double reactorP, double hertz, double ratedHertz) {
        return of(ratedKvar, volts, ratedVolts, reactorP)
                * Given.positive("hertz", hertz, "Hz")
                / Given.positive("ratedHertz", ratedHertz, "Hz");
    }
}
