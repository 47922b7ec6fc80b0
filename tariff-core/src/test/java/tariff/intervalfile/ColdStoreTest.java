// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.math.BigDecimal;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import tariff.bill.Billing;
import tariff.bill.ByTheTotals;
import tariff.bill.Statement;
import tariff.json.RateFile;
import tariff.meter.MeteredMonth;
import tariff.meter.MonthlySums;
import tariff.meter.Site;

/** The example's file is what its generator makes, and shows why hours and months say different things. */
class ColdStoreTest {
    private static final Path ROOT = Files.isDirectory(Path.of("examples")) ? Path.of("") : Path.of("..");
    private static final Path FILE = ROOT.resolve("examples/intervals/palmeira-cold-store.csv");
    private static final Path RATE = ROOT.resolve("examples/rates/ilha-verde-hourly.json");

    @Test
    void theFileIsWhatTheGeneratorMakes() throws IOException {
        assertThat(Files.readString(FILE)).isEqualTo(ColdStore.csv());
    }

    private static Billing billing() throws IOException {
        return new Billing(RateFile.parse(Files.readString(RATE)), Site.unnamed());
    }

    private static List<MeteredMonth> months() throws IOException {
        IntervalReading read = IntervalFile.read(FILE, IntervalFileOptions.in("America/Sao_Paulo"));
        assertThat(read.warnings()).isEmpty();
        return MonthlySums.of(read.series()).months();
    }

    /** E × (0.92 ÷ PF − 1)⁺ is convex in (kWh, kvarh) and grows with both, so that its sum is never below that of the sums: Jensen. */
    @Test
    void theMonthsTotalsNeverSayMoreThanTheHours() throws IOException {
        List<Statement> hourly = billing().statements(months());
        List<Statement> monthly =
                ByTheTotals.of(billing().rate(), Site.unnamed()).orElseThrow().statements(months());
        assertThat(hourly).hasSize(12);
        for (int i = 0; i < 12; i++) {
            assertThat(monthly.get(i).amount("Reactive excess"))
                    .isLessThan(hourly.get(i).amount("Reactive excess"));
            assertThat(monthly.get(i).amount("Energy")).isEqualTo(hourly.get(i).amount("Energy"));
        }
    }

    @Test
    void theDifferenceIsSaidInANote() throws IOException {
        List<Statement> hourly = billing().statements(months());
        BigDecimal total = hourly.stream().map(Statement::total).reduce(BigDecimal.ZERO, BigDecimal::add);
        assertThat(ByTheTotals.note(billing(), hourly).orElseThrow())
                .satisfies(note -> assertThat(note.code()).isEqualTo("counted-by-the-hour"))
                .satisfies(note -> assertThat(note.message())
                        .contains(total.toPlainString())
                        .contains("good hours make up for bad ones"));
    }

    @Test
    void aRateThatCountsMonthsHasNothingToCompare() throws IOException {
        Path monthly = ROOT.resolve("examples/rates/millbrook-kva-service.json");
        assertThat(ByTheTotals.of(RateFile.parse(Files.readString(monthly)), Site.unnamed()))
                .isEmpty();
    }
}
