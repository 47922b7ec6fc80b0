// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.time.LocalDate;
import java.time.YearMonth;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import tariff.meter.Period;

/**
 * The days billed, as one or two cells give them.
 *
 * @param cells one for a month, two for its first and last day; each may still be read in two orders
 */
record PeriodText(List<DateCell> cells) {
    private static final Pattern BETWEEN = Pattern.compile(
            "\\s+[-–—]\\s+|\\s*[–—…]\\s*|\\s+(?:to|bis|until|au|al|a|ate|hasta)\\s+|(?<=\\d{4})-(?=\\d{1,2}[./])",
            Pattern.CASE_INSENSITIVE);

    /** A cell that holds a month, one day, or two days with a dash or a word between. */
    static PeriodText of(String text) {
        DateCell whole = DateCell.of(text);
        if (!whole.isNothing() || text.length() > 80 || text.chars().noneMatch(Character::isDigit)) {
            return new PeriodText(List.of(whole));
        }
        Matcher between = BETWEEN.matcher(text);
        while (between.find()) {
            DateCell first = DateCell.of(text.substring(0, between.start()));
            DateCell last = DateCell.of(text.substring(between.end()));
            if (isDay(first) && isDay(last)) {
                return new PeriodText(List.of(first, last));
            }
        }
        return new PeriodText(List.of(DateCell.NOTHING));
    }

    static boolean looksLikeOne(String text) {
        return PeriodText.of(text).isDate();
    }

    boolean isDate() {
        return cells.stream().noneMatch(DateCell::isNothing);
    }

    /**
     * The period in one order of day and month. A single day stands for its calendar month if it is the month's first or last;
     * any other does not say which days were billed.
     */
    Optional<Period> period(DateOrder order) {
        if (cells.size() == 1) {
            DateCell cell = cells.get(0);
            return cell.month().map(Period::of).or(() -> cell.day(order).flatMap(PeriodText::edge));
        }
        return first(order)
                .flatMap(first ->
                        last(order).filter(last -> !last.isBefore(first)).map(last -> new Period(first, last)));
    }

    private static Optional<Period> edge(LocalDate day) {
        YearMonth month = YearMonth.from(day);
        boolean edge = day.getDayOfMonth() == 1 || day.equals(month.atEndOfMonth());
        return edge ? Optional.of(Period.of(month)) : Optional.empty();
    }

    private Optional<LocalDate> first(DateOrder order) {
        return cells.get(0)
                .month()
                .map(month -> month.atDay(1))
                .or(() -> cells.get(0).day(order));
    }

    private Optional<LocalDate> last(DateOrder order) {
        return cells.get(1)
                .month()
                .map(YearMonth::atEndOfMonth)
                .or(() -> cells.get(1).day(order));
    }

    private static boolean isDay(DateCell cell) {
        return !cell.isNothing() && cell.month().isEmpty();
    }
}
