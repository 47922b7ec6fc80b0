// SPDX-License-Identifier: Apache-2.0
package tariff.benchmark;

import java.math.BigDecimal;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.duckdb.DuckDBAppender;
import org.duckdb.DuckDBConnection;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.TearDown;
import org.openjdk.jmh.annotations.Warmup;
import tariff.correction.BankWalk;
import tariff.correction.ReactiveOutcome;
import tariff.meter.DemandInterval;
import tariff.meter.IntervalRange;
import tariff.meter.IntervalSeries;

/** Lagging kvarh before, lagging and leading kvarh after a fixed bank, by month: against a column database in memory, one thread each. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 4, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(2)
public class DatabaseBenchmark {
    private static final BigDecimal KVAR = new BigDecimal("120.00");
    private static final String SUMS = """
            SELECT month, sum(lag), sum(least(lag, lead) + greatest(lag - lead - 3000, 0)),
                   sum(least(lag, lead) + greatest(lead - lag + 3000, 0))
            FROM year GROUP BY month ORDER BY month""";

    private final IntervalSeries series = YearOfIntervals.series(1);
    private final List<IntervalRange> months = new ArrayList<>();
    private final List<Object> open = new ArrayList<>();

    @Setup
    public void load() throws SQLException {
        Connection database = DriverManager.getConnection("jdbc:duckdb:");
        try (Statement statement = database.createStatement()) {
            statement.execute("SET threads = 1");
            statement.execute("CREATE TABLE year (month TINYINT, lag BIGINT, lead BIGINT)");
        }
        try (DuckDBAppender rows = database.unwrap(DuckDBConnection.class).createAppender("main", "year")) {
            for (int month = 1; month <= 12; month++) {
                LocalDate first = LocalDate.of(2025, month, 1);
                int from = 96 * (first.getDayOfYear() - 1);
                IntervalRange range = new IntervalRange(from, from + 96 * first.lengthOfMonth());
                months.add(range);
                for (int i = range.from(); i < range.to(); i++) {
                    rows.beginRow();
                    rows.append((byte) month);
                    rows.append(series.scaledLaggingKvarh(i));
                    rows.append(series.scaledLeadingKvarh(i));
                    rows.endRow();
                }
            }
        }
        open.add(database);
        open.add(database.prepareStatement(SUMS));
        List<List<BigDecimal>> ours = sumsWalked();
        List<List<BigDecimal>> theirs = sumsInSql();
        for (int month = 0; month < 12; month++) {
            for (int figure = 0; figure < 3; figure++) {
                if (ours.get(month).get(figure).compareTo(theirs.get(month).get(figure)) != 0) {
                    throw new IllegalStateException("walked " + ours.get(month) + ", SQL " + theirs.get(month));
                }
            }
        }
    }

    @TearDown
    public void close() throws SQLException {
        ((PreparedStatement) open.get(1)).close();
        ((Connection) open.get(0)).close();
    }

    @Benchmark
    public List<List<BigDecimal>> sumsWalked() {
        List<List<BigDecimal>> sums = new ArrayList<>(12);
        for (IntervalRange month : months) {
            ReactiveOutcome after = BankWalk.fixed(series, month, DemandInterval.block(15), KVAR);
            sums.add(List.of(
                    after.laggingKvarh().add(after.avoidedKvarh()), after.laggingKvarh(), after.leadingKvarh()));
        }
        return sums;
    }

    @Benchmark
    public List<List<BigDecimal>> sumsInSql() throws SQLException {
        List<List<BigDecimal>> sums = new ArrayList<>(12);
        try (ResultSet rows = ((PreparedStatement) open.get(1)).executeQuery()) {
            while (rows.next()) {
                sums.add(List.of(kvarh(rows, 2), kvarh(rows, 3), kvarh(rows, 4)));
            }
        }
        return sums;
    }

    private static BigDecimal kvarh(ResultSet rows, int column) throws SQLException {
        return rows.getBigDecimal(column).movePointLeft(YearOfIntervals.SCALE);
    }
}
