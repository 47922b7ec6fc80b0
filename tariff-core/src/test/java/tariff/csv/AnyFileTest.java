// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import tariff.notice.Refusal;

/** Properties over generated files; the seed is the name of the case. */
class AnyFileTest {

    @Test
    void whatWasWrittenIsReadHoweverItWasWritten() {
        for (long seed = 0; seed < 150; seed++) {
            WrittenYear year = WrittenYear.of(seed);
            BillsRead read = BillsFile.read(year.bytes(), ReadingChoices.none());
            assertThat(read.months()).as("seed %d:%n%s", seed, year.text()).isEqualTo(year.months());
            assertThat(read.warnings()).as("seed %d", seed).isEmpty();
        }
    }

    @Test
    void theSameFileIsAlwaysReadTheSameWay() {
        for (long seed = 0; seed < 20; seed++) {
            byte[] bytes = WrittenYear.of(seed).bytes();
            assertThat(BillsFile.read(bytes, ReadingChoices.none()))
                    .isEqualTo(BillsFile.read(bytes, ReadingChoices.none()));
        }
    }

    @Test
    void damagedFilesAreReadOrRefusedNeverCrashed() {
        int refused = 0;
        for (long seed = 0; seed < 150; seed++) {
            Random random = new Random(seed);
            refused += isRefused(WrittenYear.of(seed % 100).damaged(random)) ? 1 : 0;
        }
        assertThat(refused).isBetween(50, 499);
    }

    @Test
    void bytesOfAnyKindAreRefused() {
        for (long seed = 0; seed < 150; seed++) {
            Random random = new Random(seed);
            byte[] bytes = new byte[random.nextInt(2000)];
            random.nextBytes(bytes);
            assertThat(isRefused(bytes)).as("seed %d", seed).isTrue();
        }
    }

    @Test
    void tablesOfAnyCellsAreReadOrRefused() {
        List<String> cells = List.of(
                "Month",
                "From",
                "To",
                "kWh",
                "kvarh",
                "kW",
                "PF",
                "Total",
                "2026-01",
                "Jan 2026",
                "03/04/2026",
                "01.02.2026",
                "1,234",
                "1.5",
                "-3",
                "(4)",
                "n/a",
                "",
                "\"",
                "#",
                "0.95C",
                "99999999999999999999",
                "1e999",
                "Year",
                "day",
                "MWh",
                "12/2026",
                "2026-01 to 2026-02",
                "31/01/2026 – 28/02/2026",
                "%",
                "İ",
                "\ud83d\ude00",
                "=1+1");
        for (long seed = 0; seed < 250; seed++) {
            Random random = new Random(seed);
            StringBuilder text = new StringBuilder("Month,kWh,From,To,PF\n".repeat(random.nextInt(2)));
            for (int i = random.nextInt(60); i > 0; i--) {
                text.append(cells.get(random.nextInt(cells.size()))).append(random.nextInt(5) == 0 ? "\n" : ",");
            }
            isRefused(BillsFileTest.bytes(text.toString()));
        }
    }

    private static boolean isRefused(byte[] bytes) {
        try {
            return BillsFile.read(bytes, ReadingChoices.none()).months().isEmpty();
        } catch (Refusal refusal) {
            assertThat(refusal.findings()).anyMatch(finding -> finding.isError());
            return true;
        }
    }
}
