// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import java.math.BigDecimal;
import java.time.DateTimeException;
import java.time.DayOfWeek;
import java.time.LocalDate;
import java.time.LocalTime;
import java.time.Month;
import java.time.format.TextStyle;
import java.util.EnumSet;
import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import tariff.meter.HolidayRule;
import tariff.meter.Window;
import tariff.rate.clause.Written;

/**
 * How a window of the day and week is written: {@code { "weekdays": "Mon-Fri", "from": "07:00", "to": "21:00", "months": [11, 12, 1],
 * "holidays": "sunday" }}. What is left out does not limit it.
 */
public final class WindowClause {
    private static final Map<String, DayOfWeek> DAYS = new LinkedHashMap<>();
    private static final Map<String, HolidayRule> HOLIDAYS = new LinkedHashMap<>();

    static {
        for (DayOfWeek day : DayOfWeek.values()) {
            DAYS.put(day.getDisplayName(TextStyle.SHORT, Locale.ENGLISH), day);
        }
        HOLIDAYS.put("weekday", HolidayRule.AS_ITS_WEEKDAY);
        HOLIDAYS.put("sunday", HolidayRule.AS_SUNDAY);
        HOLIDAYS.put("excluded", HolidayRule.EXCLUDED);
    }

    private WindowClause() {}

    /** @param holidays the dates that the rate calls holidays */
    static Window read(Written in, Set<LocalDate> holidays) {
        Window window = daysAndTimes(in, "an object with any of: weekdays, from, to, months, holidays")
                .withHolidays(in.word("holidays", HOLIDAYS, HolidayRule.AS_ITS_WEEKDAY), holidays);
        in.refuseOtherKeys();
        return window;
    }

    /** A window of something that knows no holidays, such as a time switch. */
    public static Window readWithoutHolidays(Written in) {
        Window window = daysAndTimes(in, "an object with any of: weekdays, from, to, months");
        in.refuseOtherKeys();
        return window;
    }

    private static Window daysAndTimes(Written in, String allowed) {
        if (!in.isObject()) {
            in.wrong("type", "must be a window", allowed);
        }
        return new Window(
                in.has("weekdays") ? weekdays(in.at("weekdays")) : EnumSet.allOf(DayOfWeek.class),
                time(in, "from"),
                time(in, "to"),
                in.has("months") ? months(in) : EnumSet.allOf(Month.class),
                HolidayRule.AS_ITS_WEEKDAY,
                Set.of());
    }

    private static Set<DayOfWeek> weekdays(Written in) {
        Set<DayOfWeek> days = new TreeSet<>();
        for (String part : in.text().split(",", -1)) {
            String[] ends = part.trim().split("-", 2);
            DayOfWeek first = DAYS.get(ends[0].trim());
            DayOfWeek last = DAYS.get(ends[ends.length - 1].trim());
            if (first == null || last == null) {
                in.wrong("weekdays", "are not days of the week", "days or ranges such as \"Mon-Fri\" or \"Sat, Sun\"");
                return EnumSet.allOf(DayOfWeek.class);
            }
            for (DayOfWeek day = first; day != last; day = day.plus(1)) {
                days.add(day);
            }
            days.add(last);
        }
        return days;
    }

    private static LocalTime time(Written in, String key) {
        String text = in.optionalText(key).orElse("00:00");
        if (text.equals("24:00")) {
            return LocalTime.MIDNIGHT;
        }
        try {
            return text.length() == 5 ? LocalTime.parse(text) : refuse(in, key);
        } catch (DateTimeException e) {
            return refuse(in, key);
        }
    }

    private static LocalTime refuse(Written in, String key) {
        in.at(key).wrong("time", "is not a time of day", "hours and minutes, 00:00 to 24:00");
        return LocalTime.MIDNIGHT;
    }

    private static Set<Month> months(Written in) {
        Set<Month> months = new TreeSet<>();
        for (Written each : in.list("months")) {
            BigDecimal number = each.number();
            if (number.stripTrailingZeros().scale() > 0
                    || number.compareTo(BigDecimal.ONE) < 0
                    || number.compareTo(BigDecimal.valueOf(12)) > 0) {
                each.wrong("month", "is not a month", "1 (January) to 12");
            } else {
                months.add(Month.of(number.intValueExact()));
            }
        }
        return months.isEmpty() ? EnumSet.allOf(Month.class) : months;
    }
}
