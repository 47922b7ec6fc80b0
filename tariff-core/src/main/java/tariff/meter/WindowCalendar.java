// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.time.LocalDate;
import java.time.zone.ZoneOffsetTransition;
import java.time.zone.ZoneRules;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;

/** Which windows each interval of a series falls in, worked out once and shared by everything that asks. */
public final class WindowCalendar {
    private final List<String> names;
    private final long[] masks;

    /**
     * @param windows by the rate's name, at most 64; they may overlap
     * @throws IllegalArgumentException if there are more
     */
    public WindowCalendar(IntervalSeries series, Map<String, Window> windows) {
        TreeMap<String, Window> sorted = new TreeMap<>(windows);
        if (sorted.size() > Long.SIZE) {
            throw new IllegalArgumentException(sorted.size() + " windows; allowed: 64");
        }
        names = List.copyOf(sorted.keySet());
        masks = masks(series, sorted.values().toArray(new Window[0]));
    }

    /** The windows' names in alphabetical order. */
    public List<String> names() {
        return names;
    }

    /** The windows of an interval, one bit for each in the order of {@link #names()}. */
    public long mask(int interval) {
        return masks[interval];
    }

    public boolean holds(int interval, String window) {
        return (masks[interval] & bit(window)) != 0;
    }

    /**
     * The bit that stands for a window in {@link #mask}.
     *
     * @throws IllegalArgumentException if there is no such window
     */
    public long bit(String window) {
        int index = names.indexOf(window);
        if (index < 0) {
            throw new IllegalArgumentException("no window \"" + window + "\"; there are " + names);
        }
        return 1L << index;
    }

    private static long[] masks(IntervalSeries series, Window[] windows) {
        long[] masks = new long[series.size()];
        if (windows.length == 0) {
            return masks;
        }
        ZoneRules rules = series.zone().getRules();
        long today = Long.MIN_VALUE;
        long applying = 0;
        long offset = 0;
        long nextChange = Long.MIN_VALUE;
        long minute = series.start().getEpochSecond() / 60;
        for (int i = 0; i < masks.length; i++, minute += series.stepMinutes()) {
            if (minute >= nextChange) {
                offset = rules.getOffset(series.startOf(i)).getTotalSeconds() / 60;
                @Nullable ZoneOffsetTransition next = rules.nextTransition(series.startOf(i));
                nextChange = next == null ? Long.MAX_VALUE : next.toEpochSecond() / 60;
            }
            long local = minute + offset;
            long day = Math.floorDiv(local, 24 * 60);
            if (day != today) {
                today = day;
                applying = applying(windows, LocalDate.ofEpochDay(day));
            }
            masks[i] = holding(windows, applying, Math.floorMod(local, 24 * 60));
        }
        return masks;
    }

    private static long applying(Window[] windows, LocalDate date) {
        long mask = 0;
        for (int w = 0; w < windows.length; w++) {
            mask |= windows[w].appliesOn(date) ? 1L << w : 0;
        }
        return mask;
    }

    private static long holding(Window[] windows, long applying, int minuteOfDay) {
        long mask = 0;
        for (int w = 0; w < windows.length; w++) {
            mask |= (applying & 1L << w) != 0 && windows[w].holdsAt(minuteOfDay) ? 1L << w : 0;
        }
        return mask;
    }
}
