// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDateTime;
import java.time.ZoneOffset;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import tariff.csv.DateOrder;

class StampTest {
    // ISO 8601 for the first rows; the others are common practice, no source
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "2026-03-04T00:15 | 2026-03-04T00:15",
                "2026-03-04 00:15:00 | 2026-03-04T00:15",
                "2026-03-04T00:15:00.000Z | 2026-03-04T00:15",
                "2026/03/04 0:15 | 2026-03-04T00:15",
                "4/3/2026 0:15 | 2026-03-04T00:15",
                "04.03.2026 00:15 | 2026-03-04T00:15",
                "04-03-2026 23:45 | 2026-03-04T23:45",
                "04.03.2026, 00:15 | 2026-03-04T00:15",
                "04.03.2026 24:00 | 2026-03-05T00:00",
                "4/3/2026 12:15 AM | 2026-03-04T00:15",
                "4/3/2026 12:15 pm | 2026-03-04T12:15",
                "4/3/2026 | 2026-03-04T00:00",
            })
    void readsWhatMetersWrite(String text, LocalDateTime moment) {
        long local = Stamp.localMinute(Stamp.read(text), DateOrder.DAY_FIRST);
        assertThat(LocalDateTime.ofEpochSecond(local * 60, 0, ZoneOffset.UTC)).isEqualTo(moment);
    }

    @ParameterizedTest
    @CsvSource({
        "2026-03-04T00:15Z, 0",
        "2026-03-04T00:15+01:00, 60",
        "2026-03-04T00:15-0330, -210",
        "2026-03-04 00:15+02, 120"
    })
    void readsTheOffset(String text, int minutes) {
        assertThat(Stamp.hasOffset(Stamp.read(text))).isTrue();
        assertThat(Stamp.offsetMinutes(Stamp.read(text))).isEqualTo(minutes);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                "x",
                "12",
                "1.5",
                "2026-03",
                "2026-03-04T00:15:30",
                "2026-03-04T24:15",
                "2026-03-04T00:60",
                "1/2/26 0:15",
                "2026-03-04T00:15+25:00",
                "99/99/2026 0:15",
                "2026-03-04T",
                "13:00 PM"
            })
    void refusesWhatIsNoStampOnAWholeMinute(String text) {

        assertThat(Stamp.read(text)).isEqualTo(Stamp.UNREADABLE);
    }

    @Test
    void monthFirstSwapsOpenDatesOnly() {
        assertThat(Stamp.localMinute(Stamp.read("3/4/2026 0:15"), DateOrder.MONTH_FIRST))
                .isEqualTo(Stamp.localMinute(Stamp.read("2026-03-04 00:15"), DateOrder.MONTH_FIRST));
        assertThat(Stamp.localMinute(Stamp.read("30/2/2026"), DateOrder.DAY_FIRST))
                .isEqualTo(Long.MIN_VALUE);
    }
}
