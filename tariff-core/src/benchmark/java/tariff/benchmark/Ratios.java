// SPDX-License-Identifier: Apache-2.0
package tariff.benchmark;

import java.math.BigDecimal;
import java.util.Collection;
import java.util.Locale;
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.OptionsBuilder;

/** Runs the benchmarks and prints the ratio that each of them is about. */
public final class Ratios {
    private Ratios() {}

    public static void main(String[] args) throws RunnerException {
        String which = args.length == 0 ? "tariff.benchmark" : args[0];
        Collection<RunResult> results =
                new Runner(new OptionsBuilder().include(which).build()).run();
        ratio(results, "rateAsData", "byHand", 3);
        ratio(results, "billedYear", "bareLoop", 10);
        ratio(results, "walkedYear", "bareWalk", 1.5);
        ratio(results, "twoHundredSizes", "walkedYear", 30);
        ratio(results, "sumsWalked", "sumsInSql", 0.2);
        ratio(results, "readYear", "rowsWalked", 1.5);
    }

    private static void ratio(Collection<RunResult> results, String ours, String reference, double most) {
        if (results.stream()
                .anyMatch(result -> result.getPrimaryResult().getLabel().equals(ours))) {
            double ratio = score(results, ours) / score(results, reference);
            System.out.printf(
                    Locale.ROOT,
                    "%s ÷ %s = %.2f (at most %s)%n",
                    ours,
                    reference,
                    ratio,
                    BigDecimal.valueOf(most).stripTrailingZeros().toPlainString());
        }
    }

    private static double score(Collection<RunResult> results, String name) {
        return results.stream()
                .filter(result -> result.getPrimaryResult().getLabel().equals(name))
                .findFirst()
                .orElseThrow()
                .getPrimaryResult()
                .getScore();
    }
}
