// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import java.util.Map;

/**
 * What harmonic voltages make a capacitor bear, each as a multiple of its rating. With voltages V_h across the capacitor per unit of its
 * rated voltage: {@code V_rms = √ΣV_h²}, {@code V_peak = ΣV_h} (all crests together, the worst), {@code I_rms = √Σ(h V_h)²},
 * {@code kvar = Σ h V_h²}. Source: own arithmetic from {@code I_h = h ω C V_h}.
 *
 * @param rmsVoltage over rated
 * @param peakVoltage over rated crest
 * @param rmsCurrent over rated
 * @param kvar over rated
 */
public record HarmonicDuty(double rmsVoltage, double peakVoltage, double rmsCurrent, double kvar) {

    /**
     * From the voltages at the bus. Behind a reactor the capacitor sees {@code u/(1 − p)} of the fundamental and
     * {@code u u_h / |p h² − 1|} of a harmonic. Resonance with the network is not in here: the voltages are those with the bank on.
     *
     * @param fundamental u, bus voltage over the capacitor's rated voltage, above 0
     * @param harmonics u_h by order h, each a fraction of the fundamental, 0 or more
     * @param reactorP p in [0, 1); no harmonic may be tuned exactly
     * @throws IllegalArgumentException outside these ranges
     */
    public static HarmonicDuty of(double fundamental, Map<Integer, Double> harmonics, double reactorP) {
        double first = Given.positive("fundamental", fundamental, "of rated voltage") / (1 - Given.reactorP(reactorP));
        double squares = first * first;
        double sum = first;
        double currents = first * first;
        double kvar = first * first;
        for (Map.Entry<Integer, Double> each : harmonics.entrySet()) {
            int h = Given.order(each.getKey());
            double share = Given.notNegative("harmonics", each.getValue(), "of the fundamental");
            double volts = fundamental * share * acrossCapacitor(h, reactorP);
            squares += volts * volts;
            sum += volts;
            currents += h * volts * (h * volts);
            kvar += h * volts * volts;
        }
        return new HarmonicDuty(Math.sqrt(squares), sum, Math.sqrt(currents), kvar);
    }

    /**
     * Harmonic current over the branch's fundamental current, {@code u_h (1 − p) / |p h − 1/h|}: {@code h u_h} without a reactor.
     *
     * @param order h, from 2
     * @param voltageShare u_h at the bus, fraction of the fundamental, 0 or more
     */
    public static double currentShare(int order, double voltageShare, double reactorP) {
        Given.notNegative("voltageShare", voltageShare, "of the fundamental");
        return Given.order(order) * voltageShare * (1 - Given.reactorP(reactorP)) * acrossCapacitor(order, reactorP);
    }

    private static double acrossCapacitor(int order, double reactorP) {
        double detuning = Math.abs(reactorP * order * order - 1);
        Given.value("reactorP", reactorP, detuning > 1e-9, "not tuned to order " + order);
        return 1 / detuning;
    }
}
