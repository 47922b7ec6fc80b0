// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/**
 * Where a bank and the network's reactance meet in parallel resonance, and how far it lifts the harmonics near by. Lossless: the
 * network is a reactance {@code h / S}, the branch {@code (p h − 1/h) / Q}; damping and background distortion are left out, so this
 * warns and does not predict. Source: {@code h = √(S/Q)}, IEEE Std 141 (from memory) and formula sheets on harmonic resonance; with
 * a reactor and the amplification, own arithmetic from the circuit.
 */
public final class Resonance {
    private Resonance() {}

    /**
     * Order of the parallel resonance, {@code 1 / √(p + Q/S)}: {@code √(S/Q)} without a reactor.
     *
     * @param shortCircuitKva S at the bus [kVA], above 0
     * @param capacitorKvar Q of the capacitors alone at the bus voltage [kvar], above 0
     * @param reactorP p in [0, 1)
     * @throws IllegalArgumentException outside these ranges
     */
    public static double order(double shortCircuitKva, double capacitorKvar, double reactorP) {
        return 1 / Math.sqrt(Given.reactorP(reactorP) + share(shortCircuitKva, capacitorKvar));
    }

    /** Without a reactor, {@code √(S/Q)}. */
    public static double order(double shortCircuitKva, double capacitorKvar) {
        return order(shortCircuitKva, capacitorKvar, 0);
    }

    /** The plain bank that would tune the bus to an order exactly, {@code S / h²} [kvar]. */
    public static double kvarTunedTo(int order, double shortCircuitKva) {
        Given.order(order);
        return Given.positive("shortCircuitKva", shortCircuitKva, "kVA") / ((double) order * order);
    }

    /**
     * Harmonic current into the network per ampere that the loads inject, {@code |p h² − 1| / |(p + Q/S) h² − 1|}; without a reactor
     * {@code h_r² / |h_r² − h²|}. Infinite at resonance.
     *
     * @param order h, from 2
     */
    public static double networkAmplification(
            double shortCircuitKva, double capacitorKvar, double reactorP, int order) {
        double square = (double) Given.order(order) * order;
        double share = share(shortCircuitKva, capacitorKvar);
        return Math.abs(Given.reactorP(reactorP) * square - 1) / Math.abs((reactorP + share) * square - 1);
    }

    /**
     * Harmonic current into the bank per ampere injected, {@code (Q/S) h² / |(p + Q/S) h² − 1|}; without a reactor
     * {@code h² / |h_r² − h²|}. Infinite at resonance.
     */
    public static double bankAmplification(double shortCircuitKva, double capacitorKvar, double reactorP, int order) {
        double square = (double) Given.order(order) * order;
        double share = share(shortCircuitKva, capacitorKvar);
        return share * square / Math.abs((Given.reactorP(reactorP) + share) * square - 1);
    }

    private static double share(double shortCircuitKva, double capacitorKvar) {
        return Given.positive("capacitorKvar", capacitorKvar, "kvar")
                / Given.positive("shortCircuitKva", shortCircuitKva, "kVA");
    }
}
