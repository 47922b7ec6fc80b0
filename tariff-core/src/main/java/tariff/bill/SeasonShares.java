// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import tariff.meter.Period;
import tariff.meter.Triangle;
import tariff.rate.Rate;
import tariff.rate.clause.Facts.SeasonShare;

/** Which of a rate's seasons a period lies in, and for how much of it. */
final class SeasonShares {
    private SeasonShares() {}

    static List<SeasonShare> of(Rate rate, Period period, LocalDate statementDate) {
        return switch (rate.definition().seasonBy()) {
            case FIRST_DAY -> List.of(new SeasonShare(rate.season(period.first()), BigDecimal.ONE));
            case LAST_DAY -> List.of(new SeasonShare(rate.season(period.last()), BigDecimal.ONE));
            case STATEMENT_DATE -> List.of(new SeasonShare(rate.season(statementDate), BigDecimal.ONE));
            case DAYS -> byDays(rate, period);
        };
    }

    private static List<SeasonShare> byDays(Rate rate, Period period) {
        String first = rate.season(period.first());
        Map<String, Integer> days = new LinkedHashMap<>();
        for (LocalDate day = period.first(); !day.isAfter(period.last()); day = day.plusDays(1)) {
            days.merge(rate.season(day), 1, Integer::sum);
        }
        if (days.size() == 1) {
            return List.of(new SeasonShare(first, BigDecimal.ONE));
        }
        BigDecimal all = BigDecimal.valueOf(period.days());
        return days.entrySet().stream()
                .map(each -> new SeasonShare(
                        each.getKey(), BigDecimal.valueOf(each.getValue()).divide(all, Triangle.PRECISION)))
                .toList();
    }
}
