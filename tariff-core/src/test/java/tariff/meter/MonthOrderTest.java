// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.time.LocalDate;
import java.util.List;
import org.junit.jupiter.api.Test;
import tariff.notice.Refusal;

class MonthOrderTest {

    private static MeteredMonth from(String first, String last) {
        return new MeteredMonth(new Period(LocalDate.parse(first), LocalDate.parse(last)), Readings.none());
    }

    @Test
    void newestFirstIsTurnedRound() {
        List<MeteredMonth> months =
                List.of(MeteredMonth.of("2025-03"), MeteredMonth.of("2025-01"), MeteredMonth.of("2025-02"));
        assertThat(MonthOrder.of(months))
                .extracting(month -> month.period().toString())
                .containsExactly("2025-01", "2025-02", "2025-03");
    }

    @Test
    void everyOverlapIsNamed() {
        List<MeteredMonth> months =
                List.of(MeteredMonth.of("2025-01"), MeteredMonth.of("2025-01"), from("2025-01-30", "2025-02-27"));
        assertThatThrownBy(() -> MonthOrder.of(months))
                .isInstanceOf(Refusal.class)
                .hasMessage("2025-01: is given twice\n2025-01-30 to 2025-02-27: shares 2 days with 2025-01");
    }

    @Test
    void aGapIsAnAssumption() {
        assertThat(MonthOrder.gaps(List.of(MeteredMonth.of("2025-01"), MeteredMonth.of("2025-03")))
                        .get(0)
                        .message())
                .isEqualTo(
                        "28 days between 2025-01 and 2025-03 are not given; the months are taken to follow each other");
    }

    @Test
    void aPeriodBelongsToTheMonthThatHoldsMostOfIt() {
        assertThat(from("2025-01-20", "2025-02-19").period().month()).hasToString("2025-02");
        assertThat(from("2025-01-15", "2025-02-14").period().month()).hasToString("2025-01");
    }
}
