// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import java.util.function.DoubleUnaryOperator;

/**
 * What switched steps make of the load curve that the central case assumes: the mean of two worlds, for bills do not tell which is the
 * site's. The controller leaves the aim A of the lagging kvarh Q that fixed kvar f leave; with L the curve, the steps work on kvarh above x
 * kvar of
 *
 * <ul>
 *   <li>ρ L(f + x ÷ ρ), ρ = 1 − A ÷ Q, if kW rise and fall in step with kvar, so that the aim is always the same share;
 *   <li>L(f + A ÷ T + x), if kW are even over the T hours, so that the aim is always the same kvar.
 * </ul>
 *
 * <p>Without an aim they are one. What the steps give beyond it eats into the aim first. Own derivation.
 *
 * @param laggingKvarh what stays lagging
 * @param sentBackKvarh what the steps send back
 */
record LikelySteps(BigDecimal laggingKvarh, BigDecimal sentBackKvarh) {
    private static final int DECIMALS = 3;

    /**
     * @param on the load in the hours in which the bank is on
     * @param aimKvarh what the controller leaves of it on purpose, if there is so much
     */
    static LikelySteps of(ReactiveMonth on, CapacitorBank bank, BigDecimal aimKvarh) {
        LoadCurve curve = on.curve();
        double fixed = bank.effectiveFixedKvar().doubleValue();
        double switched = bank.effectiveSwitchedKvar().doubleValue();
        double gap = bank.widestGapKvar().doubleValue();
        double rest = curve.left(fixed);
        double aim = Math.min(aimKvarh.doubleValue(), rest);
        double meanAim = aim / on.hours().doubleValue();
        double share = rest > 0 ? 1 - aim / rest : 0;
        DoubleUnaryOperator inStep = kvar -> share > 0 ? share * curve.left(fixed + kvar / share) : 0;
        DoubleUnaryOperator even = kvar -> curve.left(fixed + meanAim + kvar);
        double lagging = 0;
        double sentBack = 0;
        List<DoubleUnaryOperator> worlds = aim > 0 ? List.of(inStep, even) : List.of(even);
        for (DoubleUnaryOperator wanted : worlds) {
            Stepping steps = Stepping.of(wanted, switched, gap);
            double back = steps.sentBack(meanAim, gap);
            lagging += (rest - wanted.applyAsDouble(0) + steps.unsupplied() - (steps.oversupplied() - back))
                    / worlds.size();
            sentBack += back / worlds.size();
        }
        return new LikelySteps(kvarh(lagging), kvarh(sentBack));
    }

    private static BigDecimal kvarh(double value) {
        return BigDecimal.valueOf(value).setScale(DECIMALS, RoundingMode.HALF_UP);
    }
}
