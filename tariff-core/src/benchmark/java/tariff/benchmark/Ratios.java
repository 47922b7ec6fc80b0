// SPDX-License-Identifier: Apache-2.0
package tariff.benchmark;

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
    }

    private static void ratio(Collection<RunResult> results, String ours, String reference, double most) {
        if (results.stream()
                .anyMatch(result -> result.getPrimaryResult().getLabel().equals(ours))) {
            double ratio = score(results, ours) / score(results, reference);
            System.out.printf(Locale.ROOT, "%s ÷ %s = %.2f (at most %.0f)%n", ours, reference, ratio, most);
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
