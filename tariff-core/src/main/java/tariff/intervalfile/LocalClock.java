// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.time.Instant;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.time.zone.ZoneOffsetTransition;
import java.time.zone.ZoneRules;
import java.util.NavigableSet;
import java.util.TreeSet;
import org.jspecify.annotations.Nullable;

/** Turns local stamps into moments, in minutes since 1970; between two changes of the clock without a look-up. */
final class LocalClock {
    private final ZoneRules rules;
    private long plainFrom = 1;
    private long plainTo;
    private long offset;

    LocalClock(ZoneId zone) {
        this.rules = zone.getRules();
    }

    /** Whether the clock reads the minute, and the step before it, exactly once and with one offset. */
    boolean isPlain(long local, int step) {
        if (local >= plainFrom && local < plainTo) {
            return true;
        }
        ZoneOffset at = rules.getOffset(Instant.ofEpochSecond((local - 24 * 60) * 60));
        Instant before = Instant.ofEpochSecond((local - 48 * 60) * 60);
        @Nullable ZoneOffsetTransition last = rules.previousTransition(before.plusSeconds(1));
        @Nullable ZoneOffsetTransition next = rules.nextTransition(before);
        plainFrom = last == null ? Long.MIN_VALUE : last.toEpochSecond() / 60 + 48 * 60;
        plainTo = next == null ? Long.MAX_VALUE : next.toEpochSecond() / 60 - 48 * 60;
        offset = at.getTotalSeconds() / 60;
        return local - step >= plainFrom && local < plainTo;
    }

    /** For a plain minute. */
    long moment(long local) {
        return local - offset;
    }

    /**
     * The moments that a stamp may mean, earliest first: none in the hour that spring skips, two in the hour that autumn
     * repeats. A stamp that ends an interval may also be read by the offset in which the interval began.
     */
    NavigableSet<Long> moments(long local, int step, boolean endsInterval) {
        TreeSet<Long> moments = new TreeSet<>();
        for (ZoneOffset each : rules.getValidOffsets(wall(local))) {
            moments.add(local - each.getTotalSeconds() / 60);
        }
        if (endsInterval) {
            for (ZoneOffset each : rules.getValidOffsets(wall(local - step))) {
                moments.add(local - each.getTotalSeconds() / 60);
            }
        }
        return moments;
    }

    private static LocalDateTime wall(long local) {
        return LocalDateTime.ofEpochSecond(local * 60, 0, ZoneOffset.UTC);
    }
}
