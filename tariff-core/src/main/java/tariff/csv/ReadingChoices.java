// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.util.List;
import java.util.Optional;

/**
 * What the person who asks knows about the file, and what the rate calls its parts.
 *
 * @param dates the order of day and month, if the file does not show it
 * @param decimal the decimal mark, if the file does not show it
 * @param windows the rate's time-of-use windows; a heading {@code kWh night} is read only if {@code night} is among them
 * @param lines the rate's lines; a heading that names one holds the amounts charged for it
 */
public record ReadingChoices(
        Optional<DateOrder> dates, Optional<DecimalMark> decimal, List<String> windows, List<String> lines) {

    public ReadingChoices {
        windows = List.copyOf(windows);
        lines = List.copyOf(lines);
    }

    /** Nothing is known beforehand. */
    public static ReadingChoices none() {
        return new ReadingChoices(Optional.empty(), Optional.empty(), List.of(), List.of());
    }

    public ReadingChoices dates(DateOrder order) {
        return new ReadingChoices(Optional.of(order), decimal, windows, lines);
    }

    public ReadingChoices decimal(DecimalMark mark) {
        return new ReadingChoices(dates, Optional.of(mark), windows, lines);
    }

    public ReadingChoices windows(String... names) {
        return new ReadingChoices(dates, decimal, List.of(names), lines);
    }

    public ReadingChoices lines(String... names) {
        return new ReadingChoices(dates, decimal, windows, List.of(names));
    }
}
