// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/**
 * What a series reactor does to a capacitor branch. p is the reactor's reactance over the capacitor's at the service frequency,
 * 0.07 for "7 %". Source: series circuit, own arithmetic; 189 Hz at 7 % and 50 Hz is the figure that reactor makers print.
 */
public final class Detuning {
    private Detuning() {}

    /**
     * The order at which reactor and capacitor cancel, {@code n = 1 / √p}.
     *
     * @param reactorP p in (0, 1)
     * @throws IllegalArgumentException outside that range; without a reactor there is no tuning
     */
    public static double order(double reactorP) {
        Given.value("reactorP", reactorP, reactorP > 0 && reactorP < 1, "above 0, below 1");
        return 1 / Math.sqrt(reactorP);
    }

    /** The frequency of that order, {@code f / √p} [Hz]. */
    public static double hertz(double reactorP, double serviceHertz) {
        return Given.positive("serviceHertz", serviceHertz, "Hz") * order(reactorP);
    }

    /**
     * The voltage that the capacitor then stands, {@code U / (1 − p)} [V], before any harmonic voltage.
     *
     * @param volts U at the bus [V], above 0
     * @param reactorP p in [0, 1)
     */
    public static double capacitorVolts(double volts, double reactorP) {
        return Given.positive("volts", volts, "V") / (1 - Given.reactorP(reactorP));
    }
}
