// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import java.util.Comparator;
import java.util.List;
import java.util.Set;

/**
 * The resonance with one combination of steps in service, and the harmonic it lifts most.
 *
 * @param capacitorKvar of the capacitors alone at the bus voltage [kvar]
 * @param order of the parallel resonance at that kvar
 * @param harmonic the order lifted most
 * @param amplification of that harmonic's current into the network, the worst within the capacitance tolerance
 */
public record ResonancePoint(double capacitorKvar, double order, int harmonic, double amplification) {

    /**
     * One combination against the harmonics that may be there.
     *
     * @param tolerance the interval of capacitance searched for the worst case
     * @throws IllegalArgumentException if no harmonic is given, or outside the ranges of {@link Resonance}
     */
    public static ResonancePoint of(
            double shortCircuitKva,
            double capacitorKvar,
            double reactorP,
            CapacitanceTolerance tolerance,
            Set<Integer> harmonics) {
        int worst = harmonics.stream()
                .max(Comparator.<Integer>comparingDouble(
                                h -> worst(shortCircuitKva, capacitorKvar, reactorP, tolerance, h))
                        .thenComparing(Comparator.reverseOrder()))
                .orElseThrow(() -> new IllegalArgumentException("harmonics was empty; allowed: at least one order"));
        return new ResonancePoint(
                capacitorKvar,
                Resonance.order(shortCircuitKva, capacitorKvar, reactorP),
                worst,
                worst(shortCircuitKva, capacitorKvar, reactorP, tolerance, worst));
    }

    /** Every combination in service, by rising kvar; the parameters are those of {@link #of}. */
    public static List<ResonancePoint> over(
            List<Double> totalsKvar,
            double shortCircuitKva,
            double reactorP,
            CapacitanceTolerance tolerance,
            Set<Integer> harmonics) {
        return totalsKvar.stream()
                .map(kvar -> of(shortCircuitKva, kvar, reactorP, tolerance, harmonics))
                .toList();
    }

    public ResonanceBand band() {
        return ResonanceBand.of(amplification);
    }

    private static double worst(
            double shortCircuitKva,
            double capacitorKvar,
            double reactorP,
            CapacitanceTolerance tolerance,
            int harmonic) {
        double least = capacitorKvar * tolerance.low();
        double most = capacitorKvar * tolerance.high();
        double leastP = reactorP * tolerance.low();
        double mostP = reactorP * tolerance.high();
        boolean meets = Resonance.order(shortCircuitKva, most, mostP) <= harmonic
                && harmonic <= Resonance.order(shortCircuitKva, least, leastP);
        return meets
                ? Double.POSITIVE_INFINITY
                : Math.max(
                        Resonance.networkAmplification(shortCircuitKva, least, leastP, harmonic),
                        Resonance.networkAmplification(shortCircuitKva, most, mostP, harmonic));
    }
}
