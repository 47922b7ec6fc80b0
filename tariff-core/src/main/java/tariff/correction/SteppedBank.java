// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import tariff.meter.Window;

/**
 * An automatic bank and what its regulator is told.
 *
 * <p>The regulator switches when what is left of the reactive load leaves the target by more than two thirds of the smallest
 * step (common setting 0.6 to 0.7 of a step; above one half, or it would hunt; source: controller hardware manual). It then
 * takes the combination of steps nearest the target.
 *
 * @param stepsKvar effective kvar of each step, above 0; 1 to 24 steps that make at most 4,096 different combinations
 * @param target what it regulates to
 * @param delayIntervals whole intervals for which switching must have been wanted before; 0 if the regulator is quick beside
 *     the interval
 * @param operationsPerHour how many steps may be switched in any 60 minutes, if limited
 * @param off when a time switch keeps the bank off
 */
public record SteppedBank(
        List<BigDecimal> stepsKvar,
        Target target,
        int delayIntervals,
        Optional<Integer> operationsPerHour,
        Optional<Window> off) {
    /** @throws IllegalArgumentException naming what is out of range */
    public SteppedBank {
        stepsKvar = List.copyOf(stepsKvar);
        if (stepsKvar.isEmpty() || stepsKvar.size() > 24 || stepsKvar.stream().anyMatch(step -> step.signum() <= 0)) {
            throw new IllegalArgumentException("steps of " + stepsKvar + " kvar; allowed: 1 to 24 steps, each above 0");
        }
        if (delayIntervals < 0 || operationsPerHour.filter(most -> most < 1).isPresent()) {
            throw new IllegalArgumentException("a delay below 0 or fewer than one operation an hour");
        }
    }

    /** Quick, without a limit or a time switch. */
    public static SteppedBank of(Target target, String... stepsKvar) {
        return new SteppedBank(
                List.of(stepsKvar).stream().map(BigDecimal::new).toList(),
                target,
                0,
                Optional.empty(),
                Optional.empty());
    }

    /**
     * Lagging kvar to be left: a share of the kW, and a constant.
     *
     * @param tanPhi kvar per kW, at least 0
     * @param kvar besides, at least 0
     */
    public record Target(double tanPhi, BigDecimal kvar) {
        /** A power factor in (0, 1], lagging; tan φ = √(1/PF² − 1). */
        public static Target powerFactor(BigDecimal powerFactor) {
            double pf = powerFactor.doubleValue();
            if (!(pf > 0 && pf <= 1)) {
                throw new IllegalArgumentException(
                        "a target power factor of " + powerFactor + "; allowed: above 0 to 1");
            }
            return new Target(Math.sqrt(1 / (pf * pf) - 1), BigDecimal.ZERO);
        }

        public static Target kvar(BigDecimal kvar) {
            return new Target(0, kvar);
        }
    }
}
