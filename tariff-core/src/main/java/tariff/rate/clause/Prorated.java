// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import tariff.meter.Triangle;
import tariff.meter.Unit;

/**
 * A quantity stated for so many days, brought to the days billed: {@code { "prorated": …, "perDays": 30 }} is × days ÷ 30. With
 * {@code "perDays": 1} it is the quantity for each day. {@code "unlessDays": [25, 35]} leaves it alone in a period of 25 to 35 days.
 */
record Prorated(Quantity of, int perDays, int leastDays, int mostDays) implements Quantity {

    static Quantity read(Written in) {
        Quantity of = in.quantity("prorated");
        int perDays = in.wholeNumber("perDays", 1, 366);
        List<Written> unless = in.has("unlessDays") ? in.list("unlessDays") : List.of();
        if (unless.isEmpty()) {
            return new Prorated(of, perDays, 0, 0);
        }
        if (unless.size() != 2) {
            in.at("unlessDays").wrong("days", "must be two numbers", "the fewest and the most days, such as [25, 35]");
            return new Prorated(of, perDays, 0, 0);
        }
        return new Prorated(
                of, perDays, unless.get(0).wholeNumber(1, 366), unless.get(1).wholeNumber(1, 366));
    }

    @Override
    public Optional<Unit> unit(Scope scope) {
        return of.unit(scope.at("prorated"));
    }

    @Override
    public Figure value(Facts facts) {
        Figure whole = of.value(facts);
        int days = facts.period().days();
        if ((days >= leastDays && days <= mostDays) || days == perDays) {
            return whole;
        }
        BigDecimal value = whole.value().multiply(BigDecimal.valueOf(days));
        Figure count = Figure.given(BigDecimal.valueOf(days), Unit.DAYS, "days billed");
        if (perDays == 1) {
            return Figure.of(value, whole.unit(), "{} × {}", whole, count);
        }
        BigDecimal per = BigDecimal.valueOf(perDays);
        return Figure.of(
                value.divide(per, Triangle.PRECISION), whole.unit(), "{} × {} ÷ {}", whole, count, Figure.number(per));
    }

    @Override
    public String words() {
        String how = perDays == 1 ? " for each day billed" : " × days billed ÷ " + perDays;
        String unless = mostDays > 0 ? " (not in a period of " + leastDays + " to " + mostDays + " days)" : "";
        return of.innerWords() + how + unless;
    }

    @Override
    public List<Clause> parts() {
        return List.of(of);
    }
}
