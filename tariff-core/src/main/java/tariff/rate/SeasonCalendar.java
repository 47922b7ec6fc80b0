// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import java.time.LocalDate;
import java.util.Map;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import tariff.rate.clause.Season;

/** The season of each day of the year, looked up once for a rate. */
final class SeasonCalendar {
    private static final int LEAP_YEAR = 2028;

    private final @Nullable String[] seasons = new String[366];

    SeasonCalendar(Map<String, Season> definitions) {
        LocalDate first = LocalDate.of(LEAP_YEAR, 1, 1);
        for (int day = 0; day < seasons.length; day++) {
            for (Map.Entry<String, Season> each : definitions.entrySet()) {
                if (each.getValue().holds(first.plusDays(day))) {
                    seasons[day] = each.getKey();
                }
            }
        }
    }

    /** The season that a day lies in; the rate must have seasons. */
    String of(LocalDate day) {
        int place = day.getDayOfYear() - 1 + (day.isLeapYear() || day.getMonthValue() < 3 ? 0 : 1);
        return Objects.requireNonNull(seasons[place]);
    }
}
