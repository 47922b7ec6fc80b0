// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDateTime;
import java.time.ZoneId;
import java.time.ZoneOffset;
import org.junit.jupiter.api.Test;

class LocalClockTest {
    private final LocalClock clock = new LocalClock(ZoneId.of("Europe/Berlin"));

    /** In Berlin clocks change on 29 March 2026 at 01:00 UTC; two days later, to the minute, was once taken to reach back before it. */
    @Test
    void aMinuteIsNotPlainBecauseALaterOneWasAskedAbout() {
        clock.isPlain(local("2026-03-31T01:00"), 15);
        assertThat(clock.isPlain(local("2026-03-31T01:15"), 15)).isTrue();
        assertThat(clock.isPlain(local("2026-03-29T01:45"), 15)).isFalse();
        assertThat(clock.isPlain(local("2026-03-28T12:00"), 15)).isFalse();
    }

    @Test
    void summerIsPlainByTwoHoursAndWinterByOne() {
        assertThat(clock.isPlain(local("2026-01-10T12:00"), 15)).isTrue();
        assertThat(clock.moment(local("2026-01-10T12:00"))).isEqualTo(local("2026-01-10T11:00"));
        assertThat(clock.isPlain(local("2026-07-10T12:00"), 15)).isTrue();
        assertThat(clock.moment(local("2026-07-10T12:00"))).isEqualTo(local("2026-07-10T10:00"));
    }

    private static long local(String wall) {
        return LocalDateTime.parse(wall).toEpochSecond(ZoneOffset.UTC) / 60;
    }
}
