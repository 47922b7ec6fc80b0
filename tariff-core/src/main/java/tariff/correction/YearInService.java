// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import tariff.meter.Period;
import tariff.meter.Readings;
import tariff.meter.Register;

/**
 * What a bank did to the meter, month by month, and what its steps did for it.
 *
 * @param months the earliest first
 * @param steps over the whole of the interval data; empty for a fixed bank
 */
public record YearInService(List<Month> months, Optional<SteppedWalk> steps) {
    public YearInService {
        months = List.copyOf(months);
    }

    /** The registers of a month without the bank and with it. */
    public record Month(Period period, Readings before, Readings after) {}

    /** The months of interest of a bank that was run through interval data. */
    public static YearInService of(BankYear bank, List<Period> periods) {
        return new YearInService(
                periods.stream()
                        .map(period -> new Month(
                                period,
                                bank.before().month(period).totals(),
                                bank.month(period).totals()))
                        .toList(),
                bank.steps());
    }

    /** Leading kvarh that the meter counts with the bank and not without, over all the months. */
    public BigDecimal leadingKvarhCreated() {
        return months.stream()
                .map(month -> leading(month.after()).subtract(leading(month.before())))
                .reduce(BigDecimal.ZERO, BigDecimal::add);
    }

    /** How often a step was switched in or out, all steps together; 0 for a fixed bank. */
    public int operations() {
        return steps.stream()
                .flatMap(walk -> walk.operations().stream())
                .mapToInt(Integer::intValue)
                .sum();
    }

    private static BigDecimal leading(Readings readings) {
        return readings.get(Register.LEADING_KVARH).orElse(BigDecimal.ZERO);
    }
}
