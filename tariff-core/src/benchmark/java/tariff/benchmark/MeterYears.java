// SPDX-License-Identifier: Apache-2.0
package tariff.benchmark;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import tariff.bill.Billing;
import tariff.correction.CapacitorBank;
import tariff.correction.Estimate;
import tariff.intervalfile.IntervalFile;
import tariff.intervalfile.IntervalFileOptions;
import tariff.json.RateFile;
import tariff.meter.IntervalSeries;
import tariff.meter.MonthlySums;
import tariff.meter.Site;
import tariff.proposal.Assessment;
import tariff.proposal.Proposal;

/** A thousand meter-years in a row, each read from its text and assessed: how many a second on one thread and two, and what memory is kept. */
public final class MeterYears {
    private static final int YEARS = 1_000;
    private static final int BETWEEN_LOOKS = 250;
    private static final String RATE = """
            { "name": "Reactive", "currency": "EUR", "lines": [
                { "name": "Energy", "quantity": { "energy": "kWh" }, "price": 0.08 },
                { "name": "Reactive", "quantity": { "excess": { "energy": "lagging kvarh" },
                    "over": { "share": 0.5, "of": { "energy": "kWh" } } }, "price": 0.02 } ] }""";

    private MeterYears() {}

    public static void main(String[] args) throws InterruptedException, ExecutionException {
        int years = args.length == 0 ? YEARS : Integer.parseInt(args[0]);
        List<byte[]> files = new ArrayList<>();
        for (int seed = 1; seed <= 4; seed++) {
            files.add(YearOfIntervals.file(YearOfIntervals.series(seed)));
        }
        run(files, Math.min(years, 50), 1, false);
        double one = run(files, years, 1, true);
        double two = run(files, years, 2, true);
        System.out.printf(Locale.ROOT, "two threads ÷ one thread = %.2f%n", two / one);
    }

    private static double run(List<byte[]> files, int years, int threads, boolean told)
            throws InterruptedException, ExecutionException {
        Billing billing = new Billing(RateFile.parse(RATE), Site.unnamed());
        ExecutorService pool = Executors.newFixedThreadPool(threads);
        List<Long> kept = new ArrayList<>(List.of(keptBytes()));
        long nanos = 0;
        for (int done = 0; done < years; done += BETWEEN_LOOKS) {
            long start = System.nanoTime();
            List<Future<BigDecimal>> answers = new ArrayList<>();
            for (int i = done; i < Math.min(years, done + BETWEEN_LOOKS); i++) {
                byte[] file = files.get(i % files.size());
                answers.add(pool.submit(() -> saved(billing, file)));
            }
            for (int i = 0; i < answers.size(); i++) {
                if (!answers.get(i).get().equals(answers.get(i % files.size()).get())) {
                    throw new IllegalStateException("the same year, another answer");
                }
            }
            nanos += System.nanoTime() - start;
            answers.clear();
            kept.add(keptBytes());
        }
        pool.shutdown();
        double perSecond = years / (nanos / 1e9);
        if (told) {
            System.out.printf(
                    Locale.ROOT,
                    "%d meter-years, %d thread(s): %.1f a second; MB kept %s%n",
                    years,
                    threads,
                    perSecond,
                    kept.stream()
                            .map(bytes -> String.format(Locale.ROOT, "%.1f", bytes / 1e6))
                            .toList());
        }
        return perSecond;
    }

    private static BigDecimal saved(Billing billing, byte[] file) {
        try {
            IntervalSeries series = IntervalFile.read(new ByteArrayInputStream(file), IntervalFileOptions.in("UTC"))
                    .series();
            return Assessment.of(billing, MonthlySums.of(series), Proposal.of(CapacitorBank.fixed("120")))
                    .savings(Estimate.CENTRAL)
                    .settledYearTotal();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static long keptBytes() {
        Runtime runtime = Runtime.getRuntime();
        System.gc();
        System.gc();
        return runtime.totalMemory() - runtime.freeMemory();
    }
}
