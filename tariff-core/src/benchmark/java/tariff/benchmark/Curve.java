// SPDX-License-Identifier: Apache-2.0
package tariff.benchmark;

import java.math.BigDecimal;
import java.math.RoundingMode;
import org.hipparchus.analysis.solvers.BrentSolver;

/** The two load curves of the central case, straight down. */
final class Curve {
    private Curve() {}

    static BigDecimal left(BigDecimal kvarh, BigDecimal hours, BigDecimal peakKvar, BigDecimal bankKvar) {
        double time = hours.doubleValue();
        double total = kvarh.doubleValue();
        double mean = total / time;
        double peak = peakKvar.doubleValue();
        double bank = bankKvar.doubleValue();
        double k = peak / mean - 1;
        double x = bank / peak;
        double power =
                time * peak * ((1 - StrictMath.pow(x, (k + 1) / k)) / (k + 1) - x * (1 - StrictMath.pow(x, 1 / k)));
        double share = mean / peak;
        double s = new BrentSolver(1e-9).solve(200, v -> mean(v) - share, -500, 500);
        double removed = time * peak * (-StrictMath.expm1(-s * x) / s - x * StrictMath.exp(-s)) / -StrictMath.expm1(-s);
        return BigDecimal.valueOf(Math.max(0, (power + total - removed) / 2)).setScale(3, RoundingMode.HALF_UP);
    }

    private static double mean(double s) {
        return Math.abs(s) < 1e-5 ? 0.5 - s / 12 : 1 / s - 1 / StrictMath.expm1(s);
    }
}
