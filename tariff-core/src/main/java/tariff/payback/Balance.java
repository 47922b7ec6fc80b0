// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.TreeSet;
import java.util.stream.IntStream;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;

/**
 * The yearly rates r at which Σ flow_t ÷ (1 + r)^(t ÷ periods per year) = 0. With g = ln(1 + r) the sum is smooth; it is scanned
 * between −99 % and 1e9 (times one) in steps of 0.05 in g, and also between the turning points found on that grid, so that two
 * rates close together, or one at which the sum only touches nothing, are not passed over.
 */
final class Balance {
    private static final double LOWEST = Math.log(0.01);
    private static final double HIGHEST = Math.log(1e9);
    private static final int STEPS = 508;
    /** Share of the sum of magnitudes below which a sum in doubles is nothing. */
    private static final double NOTHING = 1e-13;

    private final int periodsPerYear;
    private final List<Double> grid;

    Balance(int periodsPerYear) {
        this.periodsPerYear = periodsPerYear;
        this.grid = IntStream.rangeClosed(0, STEPS)
                .mapToObj(step -> LOWEST + (HIGHEST - LOWEST) * step / STEPS)
                .toList();
    }

    /** Lowest first. Flows that change sign once have one rate (Descartes' rule of signs), and no scan is needed to find it. */
    List<Double> rates(double[] flows) {
        if (signChanges(flows) == 1) {
            return zeros(List.of(LOWEST, HIGHEST), flows).stream()
                    .map(Math::expm1)
                    .toList();
        }
        double[] slopes =
                IntStream.range(0, flows.length).mapToDouble(t -> t * flows[t]).toArray();
        TreeSet<Double> points = new TreeSet<>(grid);
        points.addAll(zeros(grid, slopes));
        return zeros(List.copyOf(points), flows).stream().map(Math::expm1).toList();
    }

    private static int signChanges(double[] flows) {
        int changes = 0;
        double before = 0;
        for (double flow : flows) {
            if (flow != 0) {
                changes += before * flow < 0 ? 1 : 0;
                before = flow;
            }
        }
        return changes;
    }

    private List<Double> zeros(List<Double> points, double[] flows) {
        double[] sizes = Arrays.stream(flows).map(Math::abs).toArray();
        BracketingNthOrderBrentSolver solver = new BracketingNthOrderBrentSolver(1e-15, 1e-15, 1e-300, 5);
        List<Double> zeros = new ArrayList<>();
        double signBefore = 0;
        for (int i = 0; i < points.size(); i++) {
            double g = points.get(i);
            double sum = sum(flows, g);
            double sign = Math.abs(sum) <= NOTHING * sum(sizes, g) ? 0 : Math.signum(sum);
            if (sign == 0) {
                zeros.add(g);
            } else if (signBefore * sign < 0) {
                zeros.add(solver.solve(1000, x -> sum(flows, x), points.get(i - 1), g));
            }
            signBefore = sign;
        }
        return zeros;
    }

    private double sum(double[] flows, double g) {
        double v = Math.exp(-g / periodsPerYear);
        double sum = 0;
        for (int t = flows.length - 1; t >= 0; t--) {
            sum = sum * v + flows[t];
        }
        return sum;
    }
}
