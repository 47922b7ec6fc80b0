// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import java.time.DayOfWeek;
import java.time.LocalTime;
import java.time.ZoneId;
import java.time.format.TextStyle;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.stream.Collectors;
import tariff.meter.Window;

/** A window of the day and week in words: {@code Mon to Fri 22:00 to 06:00}. */
public final class WindowWords {
    private WindowWords() {}

    /** By whatever clock the place goes. */
    public static String of(Window window) {
        return daysAndTimes(window) + exceptions(window);
    }

    static String of(Window window, ZoneId zone) {
        return daysAndTimes(window) + " (" + zone.getId() + " time)" + exceptions(window);
    }

    private static String daysAndTimes(Window window) {
        String days = window.weekdays().size() == 7 ? "every day" : names(window.weekdays());
        String hours = window.from().equals(window.to())
                ? "all day"
                : window.from() + " to " + (window.to().equals(LocalTime.MIDNIGHT) ? "24:00" : window.to());
        return days + " " + hours;
    }

    private static String exceptions(Window window) {
        String months = window.months().size() == 12
                ? ""
                : ", only in "
                        + window.months().stream()
                                .sorted()
                                .map(month -> month.getDisplayName(TextStyle.FULL, Locale.ENGLISH))
                                .collect(Collectors.joining(", "));
        String holidays = switch (window.holidayRule()) {
            case AS_ITS_WEEKDAY -> "";
            case AS_SUNDAY -> ", " + holidays(window) + " as Sundays";
            case EXCLUDED -> ", not on " + holidays(window);
        };
        return months + holidays;
    }

    private static String holidays(Window window) {
        int count = window.holidays().size();
        return "holidays (" + (count == 0 ? "none" : count) + " given)";
    }

    /** Three days or more in a row are a range. */
    private static String names(Set<DayOfWeek> days) {
        List<String> names = new ArrayList<>();
        List<DayOfWeek> run = new ArrayList<>();
        for (DayOfWeek day : DayOfWeek.values()) {
            if (days.contains(day)) {
                run.add(day);
            }
            if (!run.isEmpty() && (!days.contains(day) || day == DayOfWeek.SUNDAY)) {
                names.add(
                        run.size() < 3
                                ? run.stream().map(WindowWords::name).collect(Collectors.joining(", "))
                                : name(run.get(0)) + " to " + name(run.get(run.size() - 1)));
                run.clear();
            }
        }
        return String.join(", ", names);
    }

    private static String name(DayOfWeek day) {
        return day.getDisplayName(TextStyle.SHORT, Locale.ENGLISH);
    }
}
