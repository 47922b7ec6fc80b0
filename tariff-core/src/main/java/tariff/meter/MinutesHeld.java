// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.time.zone.ZoneOffsetTransition;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** Counts the minutes that pass while windows hold; the hour that daylight saving skips or repeats is counted so. */
final class MinutesHeld {
    private MinutesHeld() {}

    /** Minutes by the clock, from one to the one after the last. */
    record Span(int first, int end) {
        Span within(Span other) {
            int later = Math.max(first, other.first);
            return new Span(later, Math.max(later, Math.min(end, other.end)));
        }
    }

    /** Minutes of the period in which all the windows hold. */
    static long in(Period period, ZoneId zone, List<Window> windows) {
        Instant end = period.last().plusDays(1).atStartOfDay(zone).toInstant();
        boolean even = !changes(zone, period.first().atStartOfDay(zone).toInstant(), end);
        long usual = held(new Span(0, Window.DAY), windows);
        long minutes = 0;
        for (LocalDate date = period.first(); !date.isAfter(period.last()); date = date.plusDays(1)) {
            if (apply(windows, date)) {
                minutes += even ? usual : on(date, zone, windows);
            }
        }
        return minutes;
    }

    static BigDecimal hours(long minutes) {
        return BigDecimal.valueOf(minutes)
                .divide(BigDecimal.valueOf(60), 6, RoundingMode.HALF_UP)
                .stripTrailingZeros();
    }

    private static boolean apply(List<Window> windows, LocalDate date) {
        return windows.stream().allMatch(window -> window.appliesOn(date));
    }

    private static boolean changes(ZoneId zone, Instant from, Instant end) {
        @Nullable ZoneOffsetTransition next = zone.getRules().nextTransition(from);
        return next != null && next.getInstant().isBefore(end);
    }

    /** A day stretch by stretch, between changes of the clock. */
    private static long on(LocalDate date, ZoneId zone, List<Window> windows) {
        Instant at = date.atStartOfDay(zone).toInstant();
        Instant end = date.plusDays(1).atStartOfDay(zone).toInstant();
        long minutes = 0;
        while (at.isBefore(end)) {
            @Nullable ZoneOffsetTransition next = zone.getRules().nextTransition(at);
            Instant until = next == null || next.getInstant().isAfter(end) ? end : next.getInstant();
            int first = at.atZone(zone).toLocalTime().toSecondOfDay() / 60;
            int last = first + (int) ((until.getEpochSecond() - at.getEpochSecond()) / 60);
            minutes += held(new Span(first, last), windows);
            at = until;
        }
        return minutes;
    }

    private static long held(Span stretch, List<Window> windows) {
        List<Span> spans = List.of(stretch);
        for (Window window : windows) {
            spans = spans.stream()
                    .flatMap(span -> window.spans().stream().map(span::within))
                    .toList();
        }
        return spans.stream().mapToLong(span -> span.end - span.first).sum();
    }
}
