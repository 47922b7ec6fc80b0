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
        Collection<RunResult> results =
                new Runner(new OptionsBuilder().include("AssessmentBenchmark").build()).run();
        double asData = score(results, "rateAsData");
        double byHand = score(results, "byHand");
        System.out.printf(Locale.ROOT, "rate as data ÷ by hand = %.2f (at most 3)%n", asData / byHand);
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
