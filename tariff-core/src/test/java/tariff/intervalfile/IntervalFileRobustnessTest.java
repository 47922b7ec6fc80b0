// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.StringReader;
import java.time.LocalDate;
import java.util.BitSet;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import tariff.meter.IntervalSeries;
import tariff.meter.InventedYear;
import tariff.notice.Refusal;

class IntervalFileRobustnessTest {
    private static final String ODD = ";,.\"\n\r\t -+0123456789:/TZeE\0é\uFEFF";
    private static final String[] PATTERNS = {"yyyy-MM-dd HH:mm", "d/M/yyyy H:mm", "yyyy-MM-dd'T'HH:mmXXX"};

    /** A file may be read or refused; anything else that is thrown fails. */
    @ParameterizedTest
    @EnumSource(GapRule.class)
    void whateverIsDoneToAFileItIsReadOrRefused(GapRule gaps) throws IOException {
        Random random = new Random(77);
        IntervalSeries days = InventedYear.between(
                9, "Europe/Berlin", 15, LocalDate.of(2026, 10, 24), LocalDate.of(2026, 10, 27), new BitSet());
        int read = 0;
        int refused = 0;
        for (int i = 0; i < 1500; i++) {
            String pattern = PATTERNS[random.nextInt(PATTERNS.length)];
            StringBuilder text =
                    new StringBuilder(String.join("\n", InventedFile.rows(days, pattern, random.nextBoolean())));
            for (int change = random.nextInt(6); change >= 0; change--) {
                mutate(text, random);
            }
            IntervalFileOptions options =
                    IntervalFileOptions.in("Europe/Berlin").gaps(gaps).counter(random.nextInt(8) == 0);
            try {
                IntervalFile.read(new StringReader(text.toString()), options);
                read++;
            } catch (Refusal refusal) {
                assertThat(refusal.findings()).isNotEmpty();
                refused++;
            }
        }
        assertThat(read).isGreaterThan(20);
        assertThat(refused).isGreaterThan(20);
    }

    private static void mutate(StringBuilder text, Random random) {
        int at = random.nextInt(text.length());
        int until = Math.min(text.length(), at + 1 + random.nextInt(random.nextInt(10) == 0 ? 3000 : 4));
        switch (random.nextInt(4)) {
            case 0 -> text.setCharAt(at, ODD.charAt(random.nextInt(ODD.length())));
            case 1 -> text.insert(at, ODD.charAt(random.nextInt(ODD.length())));
            case 2 -> text.insert(random.nextInt(text.length()), text.substring(at, until));
            default -> text.delete(at, until).append(text.isEmpty() ? "x" : "");
        }
    }
}
