// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.time.LocalDate;
import java.time.YearMonth;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** Dates with the month in words: {@code Jan 2026}, {@code 2026 Jan}, {@code Jan-26}, {@code 5 de enero de 2026}. */
final class NamedDate {
    private static final Set<String> FILLERS = Set.of("de", "del", "do", "of", "er", "st", "nd", "rd", "th", "di");

    private NamedDate() {}

    /** @param text plain, as {@link Words} writes it; throws {@link java.time.DateTimeException} for a day that does not exist */
    static DateCell read(String text) {
        Map<String, Integer> months = MonthNames.numbers();
        List<String> tokens = Arrays.stream(text.replaceAll("(?<=\\d)(?=[a-z])|(?<=[a-z])(?=\\d)", " ")
                        .split("[\\s\\-/.,'’]+"))
                .filter(token -> !token.isEmpty() && !FILLERS.contains(token))
                .toList();
        List<String> numbers =
                tokens.stream().filter(token -> token.matches("\\d{1,4}")).toList();
        List<String> names = tokens.stream().filter(months::containsKey).toList();
        if (names.size() != 1 || numbers.isEmpty() || numbers.size() > 2 || tokens.size() != numbers.size() + 1) {
            return DateCell.NOTHING;
        }
        int month = months.getOrDefault(names.get(0), 0);
        int at = tokens.indexOf(names.get(0));
        String first = numbers.get(0);
        if (numbers.size() == 1) {
            boolean isYear = first.length() == 4 || (first.length() == 2 && at == 0);
            return isYear ? DateCell.of(YearMonth.of(DateCell.year(first), month)) : DateCell.NOTHING;
        }
        String last = numbers.get(1);
        if (first.length() == 4 && at == 1 && last.length() <= 2) {
            return DateCell.day(LocalDate.of(DateCell.year(first), month, Integer.parseInt(last)));
        }
        boolean dayThenYear = first.length() <= 2 && (last.length() == 4 || (last.length() == 2 && at == 1)) && at <= 1;
        return dayThenYear
                ? DateCell.day(LocalDate.of(DateCell.year(last), month, Integer.parseInt(first)))
                : DateCell.NOTHING;
    }
}
