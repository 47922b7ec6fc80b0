// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.math.BigDecimal;
import org.hipparchus.analysis.solvers.BrentSolver;

/**
 * The lagging kvarh that a constant bank leaves if the load follows an assumed curve: the mean of two curves with the month's mean m and
 * highest value M, x = c ÷ M.
 *
 * <ul>
 *   <li>a power curve q(τ) = M (1 − τ)^k, k = M ÷ m − 1: R = T M [ (1 − x^((k+1)/k)) ÷ (k + 1) − x (1 − x^(1/k)) ];
 *   <li>a truncated exponential, the least informed spread of q over [0, M]: density ∝ e^(−λq), λ from the mean, removed =
 *       T [ (1 − e^(−λc)) ÷ λ − c e^(−λM) ] ÷ (1 − e^(−λM)).
 * </ul>
 *
 * <p>Own derivation. On two open data sets (a small steel plant's year, UCI 851; a commercial customer's year, SimBench G0) the first came
 * out low and the second high at small banks, their mean within 19 %. It is an estimate, not a promise.
 *
 * @param mean m, kvar
 * @param peak M, kvar
 * @param hours T
 * @param shape λM of the truncated exponential
 */
record LoadCurve(double mean, double peak, double hours, double shape) {

    /** @param peakKvar at least the mean */
    static LoadCurve of(BigDecimal laggingKvarh, BigDecimal hours, BigDecimal peakKvar) {
        double time = hours.doubleValue();
        double mean = laggingKvarh.doubleValue() / time;
        double peak = peakKvar.doubleValue();
        return new LoadCurve(mean, peak, time, mean > 0 ? shape(mean / peak) : 0);
    }

    /** R in kvarh. */
    double left(double bankKvar) {
        if (mean <= 0 || bankKvar >= peak) {
            return 0;
        }
        return Math.max(0, (powerCurve(bankKvar) + mean * hours - exponentialRemoved(bankKvar)) / 2);
    }

    /** Kvarh left under the power curve. */
    double powerCurve(double bank) {
        double k = peak / mean - 1;
        if (k < 1e-9) {
            return hours * (mean - Math.min(mean, bank));
        }
        double x = bank / peak;
        double head = (1 - StrictMath.pow(x, (k + 1) / k)) / (k + 1);
        return hours * peak * (head - x * (1 - StrictMath.pow(x, 1 / k)));
    }

    /** Kvarh removed under the truncated exponential. */
    double exponentialRemoved(double bank) {
        double x = bank / peak;
        if (Math.abs(shape) < 1e-6) {
            return hours * peak * (x - x * x / 2);
        }
        if (Double.isInfinite(shape)) {
            return hours * Math.min(mean, bank);
        }
        double tail = StrictMath.exp(-shape);
        double part = -StrictMath.expm1(-shape * x) / shape - x * tail;
        return hours * peak * part / -StrictMath.expm1(-shape);
    }

    /** λM of the truncated exponential whose mean is this share of its highest value: 1 ÷ s − 1 ÷ (e^s − 1) = share. */
    private static double shape(double share) {
        double steepest = 500;
        if (share <= 1 / steepest || share >= 1 - 1 / steepest) {
            return share < 0.5 ? 1 / share : Double.POSITIVE_INFINITY;
        }
        return new BrentSolver(1e-9).solve(200, s -> meanShare(s) - share, -steepest, steepest);
    }

    private static double meanShare(double shape) {
        if (Math.abs(shape) < 1e-5) {
            return 0.5 - shape / 12;
        }
        return 1 / shape - 1 / StrictMath.expm1(shape);
    }
}
