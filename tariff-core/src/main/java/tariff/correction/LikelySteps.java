// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.math.BigDecimal;
import java.math.RoundingMode;

/**
 * What switched steps make of the load curve that the central case assumes. The controller leaves the aim A of the lagging kvarh Q that
 * fixed kvar leave; the rest, taken to run in step with the whole, is what the steps work on: its kvarh above x kvar are
 * ρ L(f + x ÷ ρ), with ρ = 1 − A ÷ Q, L the curve and f the fixed kvar. What the steps give beyond it eats into the aim first. Own
 * derivation.
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
        double step = bank.widestGapKvar().doubleValue();
        double rest = curve.left(fixed);
        double aim = Math.min(aimKvarh.doubleValue(), rest);
        double share = rest > 0 ? 1 - aim / rest : 0;
        if (share <= 0) {
            return new LikelySteps(kvarh(rest), BigDecimal.ZERO);
        }
        Stepping steps = Stepping.of(
                kvar -> share * curve.left(fixed + kvar / share),
                bank.effectiveSwitchedKvar().doubleValue(),
                step);
        double sentBack = steps.sentBack(aim / on.hours().doubleValue(), step);
        double lagging = aim + steps.unsupplied() - (steps.oversupplied() - sentBack);
        return new LikelySteps(kvarh(lagging), kvarh(sentBack));
    }

    private static BigDecimal kvarh(double value) {
        return BigDecimal.valueOf(value).setScale(DECIMALS, RoundingMode.HALF_UP);
    }
}
