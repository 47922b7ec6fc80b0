// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A bank as its nameplate and its drawing tell it. Ratings are those of the bare capacitors at the site's frequency.
 *
 * @param stepsKvar each step at {@code ratedVolts} [kvar], 1 to 24 of them, each above 0
 * @param ratedVolts of the capacitors, between lines [V], above 0
 * @param reactorP series reactor's reactance over the capacitor's, in [0, 0.25]; 0 for a plain bank
 * @param switching whether a controller switches the steps
 * @param lossWattsPerKvar of the whole bank [W/kvar], 0 or more
 * @param operationsPerDay of the busiest step, 0 or more, if known
 * @param conductorAmps ampacity of its conductors and disconnect, the less of the two [A], above 0, if known
 * @param temperatureClass of the capacitors, if known
 */
public record BankData(
        List<Double> stepsKvar,
        double ratedVolts,
        double reactorP,
        Switching switching,
        double lossWattsPerKvar,
        OptionalDouble operationsPerDay,
        OptionalDouble conductorAmps,
        Optional<TemperatureClass> temperatureClass) {

    /** Whether steps come and go with the load. */
    public enum Switching {
        FIXED,
        AUTOMATIC
    }

    /** Refuses figures outside their ranges with an {@link IllegalArgumentException}. */
    public BankData {
        stepsKvar = List.copyOf(stepsKvar);
        if (stepsKvar.isEmpty() || stepsKvar.size() > 24) {
            throw new IllegalArgumentException("stepsKvar had " + stepsKvar.size() + " steps; allowed: 1 to 24");
        }
        stepsKvar.forEach(step -> Given.positive("stepsKvar", step, "kvar"));
        Given.positive("ratedVolts", ratedVolts, "V");
        Given.value("reactorP", reactorP, reactorP >= 0 && reactorP <= 0.25, "0 (plain) to 0.25, so 0.07 for 7 %");
        Given.notNegative("lossWattsPerKvar", lossWattsPerKvar, "W/kvar");
        operationsPerDay.ifPresent(number -> Given.notNegative("operationsPerDay", number, "a day"));
        conductorAmps.ifPresent(amps -> Given.positive("conductorAmps", amps, "A"));
    }

    /** Nameplate and switching only; what else could be known is absent. */
    public static BankData of(
            List<Double> stepsKvar, double ratedVolts, double reactorP, Switching switching, double lossWattsPerKvar) {
        return new BankData(
                stepsKvar,
                ratedVolts,
                reactorP,
                switching,
                lossWattsPerKvar,
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                Optional.empty());
    }

    public boolean isFixed() {
        return switching == Switching.FIXED;
    }

    public boolean isDetuned() {
        return reactorP > 0;
    }

    /** All steps at rated voltage [kvar]. */
    public double ratedKvar() {
        return stepsKvar.stream().mapToDouble(Double::doubleValue).sum();
    }

    /** All steps, as the bus feels them with their reactors [kvar]. */
    public double effectiveKvar(double volts) {
        return EffectiveKvar.of(ratedKvar(), volts, ratedVolts, reactorP);
    }

    /** The smallest step, as the bus feels it [kvar]. */
    public double smallestStepKvar(double volts) {
        double smallest =
                stepsKvar.stream().mapToDouble(Double::doubleValue).min().orElseThrow();
        return EffectiveKvar.of(smallest, volts, ratedVolts, reactorP);
    }

    /** The largest step, or the whole of a fixed bank, as the bus feels it [kvar]: the most that is switched at once. */
    public double largestSwitchedKvar(double volts) {
        double largest =
                stepsKvar.stream().mapToDouble(Double::doubleValue).max().orElseThrow();
        return EffectiveKvar.of(isFixed() ? ratedKvar() : largest, volts, ratedVolts, reactorP);
    }

    /** Each distinct kvar that can be in service, of the capacitors alone at a voltage [kvar], rising; one of a fixed bank. */
    public List<Double> capacitorKvarInService(double volts) {
        List<Double> totals = isFixed() ? List.of(ratedKvar()) : StepCombinations.totalsKvar(stepsKvar);
        return totals.stream()
                .map(kvar -> EffectiveKvar.of(kvar, volts, ratedVolts, 0))
                .toList();
    }

    /** The tolerance that IEC 60831-1:2014 allows steps of this size, the wider one if they differ. */
    CapacitanceTolerance tolerance() {
        return stepsKvar.stream().allMatch(step -> step > 100)
                ? CapacitanceTolerance.IEC_60831_2014_ABOVE_100_KVAR
                : CapacitanceTolerance.IEC_60831_2014_UP_TO_100_KVAR;
    }
}
