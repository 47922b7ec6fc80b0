// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.YearMonth;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * What one cell can mean as a date: a day (one for each order of day and month, equal if the order does not matter), or a
 * month, or nothing.
 */
record DateCell(Optional<LocalDate> dayFirst, Optional<LocalDate> monthFirst, Optional<YearMonth> month) {
    static final DateCell NOTHING = new DateCell(Optional.empty(), Optional.empty(), Optional.empty());
    private static final int LONGEST = 60;
    private static final Pattern TIME =
            Pattern.compile("(?<=\\d)[t\\s]+\\d{1,2}:\\d{2}(:\\d{2}(\\.\\d+)?)?\\s*([ap]m)?z?$");
    private static final Pattern YEAR_FIRST = Pattern.compile("(\\d{4})([-/.])(\\d{1,2})\\2(\\d{1,2})");
    private static final Pattern BASIC = Pattern.compile("((?:19|20)\\d\\d)(\\d\\d)(\\d\\d)");
    private static final Pattern DOTS = Pattern.compile("(\\d{1,2})\\. ?(\\d{1,2})\\. ?(\\d{4}|\\d{2})");
    private static final Pattern EITHER = Pattern.compile("(\\d{1,2})([-/])(\\d{1,2})\\2(\\d{4}|\\d{2})");
    private static final Pattern YEAR_MONTH = Pattern.compile("((?:19|20)\\d\\d)[-/.]?(\\d{2}|(?<=[-/.])\\d)");
    private static final Pattern MONTH_YEAR = Pattern.compile("(\\d{1,2})[-/.]((?:19|20)\\d\\d)");

    static DateCell of(String text) {
        if (text.length() > LONGEST || text.chars().noneMatch(Character::isDigit)) {
            return NOTHING;
        }
        String plain = TIME.matcher(Words.plain(text).strip()).replaceFirst("");
        try {
            return read(plain);
        } catch (DateTimeException noSuchDay) {
            return NOTHING;
        }
    }

    static DateCell of(YearMonth month) {
        return new DateCell(Optional.empty(), Optional.empty(), Optional.of(month));
    }

    boolean isNothing() {
        return month.isEmpty() && dayFirst.isEmpty() && monthFirst.isEmpty();
    }

    /** Whether the order of day and month changes the day. */
    boolean isAmbiguous() {
        return dayFirst.isPresent() && monthFirst.isPresent() && !dayFirst.equals(monthFirst);
    }

    /** The only order in which this can be read, if there is only one. */
    Optional<DateOrder> proves() {
        if (dayFirst.isPresent() == monthFirst.isPresent()) {
            return Optional.empty();
        }
        return Optional.of(dayFirst.isPresent() ? DateOrder.DAY_FIRST : DateOrder.MONTH_FIRST);
    }

    Optional<LocalDate> day(DateOrder order) {
        return order == DateOrder.DAY_FIRST ? dayFirst : monthFirst;
    }

    private static DateCell read(String text) {
        Matcher yearFirst = YEAR_FIRST.matcher(text);
        if (yearFirst.matches()) {
            return day(LocalDate.of(number(yearFirst, 1), number(yearFirst, 3), number(yearFirst, 4)));
        }
        Matcher basic = BASIC.matcher(text);
        if (basic.matches()) {
            return day(LocalDate.of(number(basic, 1), number(basic, 2), number(basic, 3)));
        }
        Matcher dots = DOTS.matcher(text);
        if (dots.matches()) {
            return day(LocalDate.of(year(dots.group(3)), number(dots, 2), number(dots, 1)));
        }
        Matcher either = EITHER.matcher(text);
        if (either.matches()) {
            int year = year(either.group(4));
            return new DateCell(
                    existing(year, number(either, 3), number(either, 1)),
                    existing(year, number(either, 1), number(either, 3)),
                    Optional.empty());
        }
        Matcher yearMonth = YEAR_MONTH.matcher(text);
        if (yearMonth.matches()) {
            return of(YearMonth.of(number(yearMonth, 1), number(yearMonth, 2)));
        }
        Matcher monthYear = MONTH_YEAR.matcher(text);
        if (monthYear.matches()) {
            return of(YearMonth.of(number(monthYear, 2), number(monthYear, 1)));
        }
        return NamedDate.read(text);
    }

    static DateCell day(LocalDate day) {
        return new DateCell(Optional.of(day), Optional.of(day), Optional.empty());
    }

    private static Optional<LocalDate> existing(int year, int month, int day) {
        boolean exists = month >= 1
                && month <= 12
                && day >= 1
                && day <= YearMonth.of(year, month).lengthOfMonth();
        return exists ? Optional.of(LocalDate.of(year, month, day)) : Optional.empty();
    }

    private static int number(Matcher matcher, int group) {
        return Integer.parseInt(matcher.group(group));
    }

    /** Two digits are of this century: bills are not older. */
    static int year(String digits) {
        return digits.length() == 2 ? 2000 + Integer.parseInt(digits) : Integer.parseInt(digits);
    }
}
