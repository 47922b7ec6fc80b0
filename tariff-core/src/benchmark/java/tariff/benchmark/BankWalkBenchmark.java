// SPDX-License-Identifier: Apache-2.0
package tariff.benchmark;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.time.YearMonth;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.IntStream;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import tariff.correction.BankCurve;
import tariff.correction.BankWalk;
import tariff.correction.ReactiveOutcome;
import tariff.meter.DemandInterval;
import tariff.meter.IntervalRange;
import tariff.meter.IntervalSeries;

/** A fixed bank through a year, month by month: against a bare loop over primitive arrays, and for 200 sizes against one. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 4, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(2)
public class BankWalkBenchmark {
    private static final BigDecimal KVAR = new BigDecimal("120.00");
    private static final List<BigDecimal> SIZES =
            IntStream.rangeClosed(1, 200).mapToObj(BigDecimal::valueOf).toList();

    private final IntervalSeries series = YearOfIntervals.series(1);
    private final DemandInterval demand = DemandInterval.block(15);
    private final int[] firsts = IntStream.rangeClosed(1, 13)
            .map(month -> month == 13
                    ? YearOfIntervals.SIZE
                    : 96 * (LocalDate.of(2025, month, 1).getDayOfYear() - 1))
            .toArray();
    private final long[] kwh = column(series::scaledKwh);
    private final long[] lagging = column(series::scaledLaggingKvarh);
    private final long[] leading = column(series::scaledLeadingKvarh);

    private static long[] column(java.util.function.IntToLongFunction figure) {
        return IntStream.range(0, YearOfIntervals.SIZE).mapToLong(figure).toArray();
    }

    /** Every month's five figures must be the same, and every size's, or the comparison says nothing. */
    @Setup
    public void agree() {
        List<ReactiveOutcome> ours = walkedYear();
        long[][] bare = bareWalk();
        for (int month = 0; month < 12; month++) {
            if (firsts[month + 1] - firsts[month]
                    != 96 * YearMonth.of(2025, month + 1).lengthOfMonth()) {
                throw new IllegalStateException("month " + month);
            }
            ReactiveOutcome each = ours.get(month);
            check(each.laggingKvarh(), bare[month][0]);
            check(each.leadingKvarh(), bare[month][1]);
            check(each.peakLaggingKvar(), bare[month][2] * 4);
            check(each.peakLeadingKvar(), bare[month][3] * 4);
            check(each.peakKva(), bare[month][4] * 4);
        }
        List<BankCurve.Point> points = twoHundredSizes();
        for (int size = 0; size < SIZES.size(); size += 37) {
            ReactiveOutcome walked = BankWalk.fixed(series, range(5), demand, SIZES.get(size));
            BankCurve.Point point = points.get(5 * SIZES.size() + size);
            if (!point.equals(new BankCurve.Point(walked.laggingKvarh(), walked.leadingKvarh()))) {
                throw new IllegalStateException("curve " + point + ", walk " + walked);
            }
        }
    }

    private void check(BigDecimal ours, long scaled) {
        BigDecimal bare = BigDecimal.valueOf(scaled, YearOfIntervals.SCALE).divide(BigDecimal.valueOf(4));
        if (ours.compareTo(bare) != 0) {
            throw new IllegalStateException("walked " + ours + ", bare " + bare);
        }
    }

    private IntervalRange range(int month) {
        return new IntervalRange(firsts[month], firsts[month + 1]);
    }

    @Benchmark
    public List<ReactiveOutcome> walkedYear() {
        List<ReactiveOutcome> months = new ArrayList<>(12);
        for (int month = 0; month < 12; month++) {
            months.add(BankWalk.fixed(series, range(month), demand, KVAR));
        }
        return months;
    }

    @Benchmark
    public long[][] bareWalk() {
        long bank = KVAR.unscaledValue().longValueExact();
        long[][] months = new long[12][];
        for (int month = 0; month < 12; month++) {
            long sumLagging = 0;
            long sumLeading = 0;
            long peakLagging = 0;
            long peakLeading = 0;
            long squared = 0;
            for (int i = firsts[month]; i < firsts[month + 1]; i++) {
                long lag = 4 * lagging[i];
                long lead = 4 * leading[i];
                long both = Math.min(lag, lead);
                long net = lag - lead - bank;
                long newLag = both + Math.max(0, net);
                long newLead = both + Math.max(0, -net);
                sumLagging += newLag;
                sumLeading += newLead;
                peakLagging = Math.max(peakLagging, newLag);
                peakLeading = Math.max(peakLeading, newLead);
                squared = Math.max(squared, 16 * kwh[i] * kwh[i] + net * net);
            }
            months[month] = new long[] {
                sumLagging, sumLeading, peakLagging, peakLeading, Math.round(Math.sqrt((double) squared))
            };
        }
        return months;
    }

    /** One sorting for each month, then every size looked up. */
    @Benchmark
    public List<BankCurve.Point> twoHundredSizes() {
        List<BankCurve.Point> points = new ArrayList<>(12 * SIZES.size());
        for (int month = 0; month < 12; month++) {
            BankCurve curve = new BankCurve(series, range(month));
            for (BigDecimal size : SIZES) {
                points.add(curve.after(size));
            }
        }
        return points;
    }
}
