// SPDX-License-Identifier: Apache-2.0
package tariff.benchmark;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.time.LocalDate;
import java.time.YearMonth;
import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;
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
import tariff.bill.Billing;
import tariff.bill.Statement;
import tariff.json.RateFile;
import tariff.meter.DemandInterval;
import tariff.meter.IntervalSeries;
import tariff.meter.MonthlySums;
import tariff.meter.Site;
import tariff.meter.Window;
import tariff.meter.WindowCalendar;
import tariff.rate.Rate;

/** A year of quarter-hours billed under a time-of-use rate with an hourly reactive rule, against a bare loop over the arrays. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 4, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(2)
public class IntervalBillingBenchmark {
    private static final String RATE = """
            { "name": "Hourly", "currency": "EUR", "windows": { "day": { "weekdays": "Mon-Fri", "from": "06:00", "to": "22:00" } },
              "lines": [
                { "name": "Energy", "quantity": { "energy": "kWh" }, "price": 0.08 },
                { "name": "Day energy", "quantity": { "energy": "kWh", "in": "day" }, "price": 0.04 },
                { "name": "Demand", "quantity": { "peak": "kVA" }, "price": 9.50 },
                { "name": "Reactive", "quantity": { "each": "hour", "take": "sum", "of": { "excess": { "energy": "lagging kvarh" },
                    "over": { "share": 0.5, "of": { "energy": "kWh" } } } }, "price": 0.02 } ] }""";

    private final IntervalSeries series = YearOfIntervals.series(1);
    private final Rate rate = RateFile.parse(RATE);
    private final Billing billing = new Billing(rate, Site.unnamed());
    private final Map<String, Window> windows =
            Map.of("day", rate.definition().windows().get("day"));
    private final WindowCalendar calendar = new WindowCalendar(series, windows);
    private final boolean[] inDay = inDay();

    private boolean[] inDay() {
        boolean[] day = new boolean[YearOfIntervals.SIZE];
        for (int i = 0; i < day.length; i++) {
            day[i] = calendar.holds(i, "day");
        }
        return day;
    }

    @Setup
    public void agree() {
        BigDecimal asData = billedYear();
        BigDecimal bare = bareLoop();
        if (asData.compareTo(bare) != 0) {
            throw new IllegalStateException("as data " + asData + ", bare loop " + bare);
        }
    }

    @Benchmark
    public BigDecimal billedYear() {
        MonthlySums sums = new MonthlySums(series, calendar, DemandInterval.block(15), false);
        List<Statement> statements = billing.statements(sums.months());
        return statements.stream().map(Statement::total).reduce(BigDecimal.ZERO, BigDecimal::add);
    }

    @Benchmark
    public BigDecimal bareLoop() {
        BigDecimal total = BigDecimal.ZERO;
        for (int month = 1; month <= 12; month++) {
            int first = 96 * (LocalDate.of(2025, month, 1).getDayOfYear() - 1);
            int end = first + 96 * YearMonth.of(2025, month).lengthOfMonth();
            long kwh = 0;
            long dayKwh = 0;
            long squared = 0;
            long excessHalves = 0;
            for (int i = first; i < end; i += 4) {
                long hourKwh = 0;
                long hourKvarh = 0;
                for (int q = i; q < i + 4; q++) {
                    long p = series.scaledKwh(q);
                    long r = series.scaledLaggingKvarh(q) - series.scaledLeadingKvarh(q);
                    hourKwh += p;
                    hourKvarh += series.scaledLaggingKvarh(q);
                    dayKwh += inDay[q] ? p : 0;
                    squared = Math.max(squared, p * p + r * r);
                }
                kwh += hourKwh;
                excessHalves += Math.max(0, 2 * hourKvarh - hourKwh);
            }
            BigDecimal kva = BigDecimal.valueOf(Math.round(Math.sqrt(squared * 16.0)), YearOfIntervals.SCALE);
            total = total.add(money(kwh, "0.0008"))
                    .add(money(dayKwh, "0.0004"))
                    .add(kva.multiply(new BigDecimal("9.50")).setScale(2, RoundingMode.HALF_UP))
                    .add(money(excessHalves, "0.0001"));
        }
        return total;
    }

    private static BigDecimal money(long amount, String price) {
        return BigDecimal.valueOf(amount).multiply(new BigDecimal(price)).setScale(2, RoundingMode.HALF_UP);
    }
}
