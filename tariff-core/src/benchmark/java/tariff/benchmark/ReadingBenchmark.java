// SPDX-License-Identifier: Apache-2.0
package tariff.benchmark;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
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
import tariff.intervalfile.IntervalFile;
import tariff.intervalfile.IntervalFileOptions;
import tariff.meter.IntervalSeries;

/** A year of quarter-hours read, understood and checked, against a CSV parser that only walks the rows and looks at the fields' lengths. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(2)
public class ReadingBenchmark {
    private final IntervalSeries series = YearOfIntervals.series(1);
    private final byte[] file = YearOfIntervals.file(series);

    @Setup
    public void agree() throws IOException {
        IntervalSeries read = readYear();
        boolean same = read.size() == series.size() && rowsWalked() > 10L * series.size();
        for (int i = 0; same && i < series.size(); i++) {
            same = read.decimal(read.scaledKwh(i)).compareTo(series.decimal(series.scaledKwh(i))) == 0
                    && read.decimal(read.scaledLaggingKvarh(i)).compareTo(series.decimal(series.scaledLaggingKvarh(i)))
                            == 0;
        }
        if (!same) {
            throw new IllegalStateException("what was read is not what was written");
        }
    }

    @Benchmark
    public IntervalSeries readYear() throws IOException {
        return IntervalFile.read(new ByteArrayInputStream(file), IntervalFileOptions.in("UTC"))
                .series();
    }

    @Benchmark
    public long rowsWalked() throws IOException {
        long characters = 0;
        try (CsvReader<CsvRecord> csv = CsvReader.builder()
                .ofCsvRecord(new InputStreamReader(new ByteArrayInputStream(file), StandardCharsets.UTF_8))) {
            for (CsvRecord row : csv) {
                for (int field = 0; field < row.getFieldCount(); field++) {
                    characters += row.getField(field).length();
                }
            }
        }
        return characters;
    }
}
