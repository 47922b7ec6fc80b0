// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import tariff.meter.Period;
import tariff.meter.Triangle;
import tariff.rate.RateDefinition;
import tariff.rate.clause.Facts.SeasonShare;

/** Which of a rate's seasons a period lies in, and for how much of it. */
final class SeasonShares {
    private SeasonShares() {}

    static List<SeasonShare> of(RateDefinition rate, Period period, LocalDate statementDate) {
        return switch (rate.seasonBy()) {
            case FIRST_DAY -> List.of(new SeasonShare(season(rate, period.first()), BigDecimal.ONE));
            case LAST_DAY -> List.of(new SeasonShare(season(rate, period.last()), BigDecimal.ONE));
            case STATEMENT_DATE -> List.of(new SeasonShare(season(rate, statementDate), BigDecimal.ONE));
            case DAYS -> byDays(rate, period);
        };
    }

    private static List<SeasonShare> byDays(RateDefinition rate, Period period) {
        String first = season(rate, period.first());
        Map<String, Integer> days = new LinkedHashMap<>();
        for (LocalDate day = period.first(); !day.isAfter(period.last()); day = day.plusDays(1)) {
            days.merge(season(rate, day), 1, Integer::sum);
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

    private static String season(RateDefinition rate, LocalDate day) {
        return rate.seasons().entrySet().stream()
                .filter(season -> season.getValue().holds(day))
                .map(Map.Entry::getKey)
                .findFirst()
                .orElseThrow();
    }
}
