// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.YearMonth;
import java.util.Optional;
import tariff.meter.Period;
import tariff.rate.clause.Written;

/** The days billed: {@code "month": "2026-01"}, or {@code "from": "2026-01-05", "to": "2026-02-04"}. */
public final class PeriodJson {
    private static final int MOST_DAYS = 366;
    private static final String DAY = "\\d{4}-\\d{2}-\\d{2}";
    private static final int FIRST_YEAR = 1900;
    private static final int LAST_YEAR = 2199;

    private PeriodJson() {}

    static Optional<Period> read(Written in) {
        boolean month = in.has("month");
        boolean from = in.has("from");
        boolean days = in.has("to") || from;
        if (month == days) {
            in.wrong(
                    "period",
                    month ? "says both \"month\" and \"from\" or \"to\"" : "does not say which days it bills",
                    "\"month\": \"2026-01\", or \"from\": \"2026-01-05\" with \"to\": \"2026-02-04\"");
            return Optional.empty();
        }
        return month ? month(in) : days(in);
    }

    private static Optional<Period> month(Written in) {
        String text = in.text("month");
        try {
            if (text.matches("\\d{4}-\\d{2}") && inReach(YearMonth.parse(text).getYear())) {
                return Optional.of(Period.of(YearMonth.parse(text)));
            }
        } catch (DateTimeException e) {
            // reported below, with what else is no month
        }
        if (in.at("month").isText()) {
            in.at("month").wrong("month", "is not a month", "a month such as 2026-01, from 1900 to 2199");
        }
        return Optional.empty();
    }

    private static Optional<Period> days(Written in) {
        Optional<LocalDate> from = requiredDay(in, "from");
        Optional<LocalDate> to = requiredDay(in, "to");
        if (from.isEmpty() || to.isEmpty()) {
            return Optional.empty();
        }
        if (to.get().isBefore(from.get()) || from.get().plusDays(MOST_DAYS - 1).isBefore(to.get())) {
            in.at("to")
                    .wrong(
                            "period",
                            "does not end a billing period",
                            "from " + from.get() + " on, at most " + MOST_DAYS + " days");
            return Optional.empty();
        }
        return Optional.of(new Period(from.get(), to.get()));
    }

    private static Optional<LocalDate> requiredDay(Written in, String key) {
        if (!in.has(key)) {
            in.text(key);
        }
        return day(in, key);
    }

    /** A day under a key, if there is one and it is one. */
    public static Optional<LocalDate> day(Written in, String key) {
        Optional<String> text = in.optionalText(key);
        try {
            Optional<LocalDate> day = text.filter(each -> each.matches(DAY))
                    .map(LocalDate::parse)
                    .filter(each -> inReach(each.getYear()));
            if (day.isPresent() || text.isEmpty()) {
                return day;
            }
        } catch (DateTimeException e) {
            // reported below, with what else is no day
        }
        if (in.at(key).isText()) {
            in.at(key).wrong("date", "is not a day", "a day such as 2026-01-31, from 1900 to 2199");
        }
        return Optional.empty();
    }

    private static boolean inReach(int year) {
        return year >= FIRST_YEAR && year <= LAST_YEAR;
    }

    static JsonObject write(JsonObject json, Period period) {
        return period.isCalendarMonth()
                ? json.with("month", period.toString())
                : json.with("from", period.first().toString())
                        .with("to", period.last().toString());
    }
}
