// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.time.LocalDate;
import java.time.MonthDay;
import java.time.format.DateTimeParseException;

/**
 * A part of the year with prices of its own, both days included; may run over New Year: {@code { "from": "10-01", "to": "05-31" }}.
 */
public record Season(MonthDay from, MonthDay to) {

    public static Season read(Written in) {
        Season season = new Season(day(in, "from"), day(in, "to"));
        in.refuseOtherKeys();
        return season;
    }

    private static MonthDay day(Written in, String key) {
        String text = in.text(key);
        try {
            return MonthDay.parse("--" + text);
        } catch (DateTimeParseException e) {
            in.at(key).wrong("date", "is not a day of the year", "month and day, such as 06-01");
            return MonthDay.of(1, 1);
        }
    }

    public boolean holds(LocalDate day) {
        MonthDay md = MonthDay.from(day);
        boolean afterStart = !md.isBefore(from);
        boolean beforeEnd = !md.isAfter(to);
        return from.isAfter(to) ? afterStart || beforeEnd : afterStart && beforeEnd;
    }
}
