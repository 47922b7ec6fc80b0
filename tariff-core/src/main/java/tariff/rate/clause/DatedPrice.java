// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.time.format.DateTimeParseException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import tariff.meter.Period;
import tariff.meter.Triangle;
import tariff.meter.Unit;

/**
 * A price that changes on given days: {@code { "byDate": [ { "from": "2026-01-01", "price": 10 }, { "from": "2026-04-13", "price": 11 } ] }}. A
 * period that holds a change is split by days. Common practice, no source.
 */
record DatedPrice(List<From> prices) implements Price {

    /** A price from a day on. */
    record From(LocalDate day, BigDecimal price) {}

    static DatedPrice read(Written in) {
        List<From> prices = new ArrayList<>();
        for (Written each : in.list("byDate")) {
            prices.add(new From(day(each), each.number("price")));
            each.refuseOtherKeys();
        }
        return new DatedPrice(List.copyOf(prices));
    }

    private static LocalDate day(Written in) {
        String text = in.text("from");
        try {
            return LocalDate.parse(text);
        } catch (DateTimeParseException e) {
            in.at("from").wrong("date", "is not a day", "a day such as 2026-04-13");
            return LocalDate.EPOCH;
        }
    }

    @Override
    public void check(Scope scope, Optional<Unit> unit) {
        for (int i = 1; i < prices.size(); i++) {
            if (!prices.get(i).day().isAfter(prices.get(i - 1).day())) {
                scope.at("byDate")
                        .at(i)
                        .error(
                                "date-order",
                                "must begin after the price before it",
                                prices.get(i).day().toString(),
                                "a day after " + prices.get(i - 1).day());
            }
        }
    }

    @Override
    public Figure charge(Figure quantity, Facts facts) {
        Period period = facts.period();
        if (prices.get(0).day().isAfter(period.first())) {
            throw new MissingReading(
                    "the rate gives a price from " + prices.get(0).day() + " on, after this period begins");
        }
        BigDecimal weighted = BigDecimal.ZERO;
        for (int i = 0; i < prices.size(); i++) {
            LocalDate end = i + 1 < prices.size() ? prices.get(i + 1).day().minusDays(1) : LocalDate.MAX;
            if (!end.isBefore(prices.get(i).day())) {
                long days = period.overlap(new Period(
                        prices.get(i).day(), end.isAfter(period.last()) ? later(period, prices.get(i)) : end));
                weighted = weighted.add(prices.get(i).price().multiply(BigDecimal.valueOf(days)));
            }
        }
        BigDecimal money = quantity.value().multiply(weighted);
        BigDecimal days = BigDecimal.valueOf(period.days());
        BigDecimal price = weighted.divide(days, Triangle.PRECISION);
        return Figure.of(
                money.divide(days, Triangle.PRECISION),
                Unit.MONEY,
                "{} × {} (by days)",
                quantity,
                Figure.number(price));
    }

    private static LocalDate later(Period period, From price) {
        return period.last().isAfter(price.day()) ? period.last() : price.day();
    }

    @Override
    public String words(String unit) {
        return prices.stream()
                        .map(price -> Decimals.plain(price.price()) + " per " + unit + " from " + price.day())
                        .collect(Collectors.joining(", "))
                + " (a period that holds a change is split by days)";
    }

    @Override
    public boolean isFree() {
        return false;
    }
}
