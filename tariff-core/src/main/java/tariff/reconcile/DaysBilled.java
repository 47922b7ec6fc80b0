// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.List;
import java.util.function.UnaryOperator;
import java.util.stream.Stream;
import tariff.meter.MeteredMonth;
import tariff.meter.Period;

/** Days are counted otherwise: thirty in every period, or the day of the reading in both periods or in neither. */
record DaysBilled() implements Cause {

    @Override
    public String code() {
        return "days-billed";
    }

    @Override
    public Stream<Trial> trials(Case bills) {
        boolean daysCount = Stream.of("days", "prorated", "bySeason", "byDate")
                .anyMatch(key -> bills.source().mentions(key));
        if (!daysCount) {
            return Stream.empty();
        }
        return Stream.of(
                all(
                        bills,
                        "30 days in every period",
                        period -> period.days() == 30
                                ? period
                                : new Period(period.first(), period.first().plusDays(29))),
                all(
                        bills,
                        "one day more in every period (the day of the reading counted in both)",
                        period -> new Period(period.first().minusDays(1), period.last())),
                all(
                        bills,
                        "one day less in every period",
                        period -> period.days() == 1
                                ? period
                                : new Period(period.first().plusDays(1), period.last())));
    }

    private Trial all(Case bills, String words, UnaryOperator<Period> days) {
        List<MeteredMonth> changed = bills.months().stream()
                .map(month -> new MeteredMonth(
                        days.apply(month.period()),
                        month.totals(),
                        month.windows(),
                        month.charged(),
                        month.statementDate(),
                        month.estimated()))
                .toList();
        return new Trial(code(), words, bills.rate(), List.of(), changed, Trial.EVERY);
    }
}
