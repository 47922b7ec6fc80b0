// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import tariff.meter.Unit;

/**
 * A percentage of other lines, negative for a credit: {@code { "name": "Tax", "percentOf": "all above", "percent": 6 }}, or a
 * {@code "schedule"} for the percentage. Without a power factor a schedule asks nothing.
 */
record Percentage(Heading heading, BaseLines of, Optional<BigDecimal> percent, Optional<Schedule> schedule)
        implements Line {

    static Percentage read(Written in, Heading heading, List<String> above) {
        BaseLines of = BaseLines.read(in, "percentOf", above);
        if (in.has("schedule") && in.has("percent")) {
            in.wrong("percent", "says both \"percent\" and \"schedule\"", "one of the two");
        }
        return in.has("schedule")
                ? new Percentage(heading, of, Optional.empty(), Optional.of(Schedule.read(in, "schedule")))
                : new Percentage(heading, of, Optional.of(in.number("percent")), Optional.empty());
    }

    @Override
    public void check(Scope scope) {
        of.check(scope.at("percentOf"));
        schedule.ifPresent(each -> each.check(scope.at("schedule")));
    }

    @Override
    public Figure amount(Facts facts) {
        Figure base = of.value(facts);
        Optional<Figure> share = percent.map(Figure::number).or(() -> schedule.flatMap(each -> each.value(facts)));
        if (share.isEmpty()) {
            return Figure.of(BigDecimal.ZERO, Unit.MONEY, "{}, no power factor", base);
        }
        BigDecimal money = base.value().multiply(share.get().value()).movePointLeft(2);
        return Figure.of(money, Unit.MONEY, "{} × {} %", base, share.get());
    }

    @Override
    public String words(Scope scope) {
        return percent.map(number -> Decimals.plain(number) + " % of " + of.words())
                .or(() -> schedule.map(each -> "on " + of.words() + ", " + each.words("%")))
                .orElse("");
    }

    @Override
    public Optional<String> asksNothing(Set<String> nothing) {
        if (percent.isPresent() && percent.get().signum() == 0) {
            return Optional.of("asks nothing: it takes 0 %");
        }
        return nothing.containsAll(of.lines())
                ? Optional.of("asks nothing: it is a percentage of lines that ask nothing (" + of.words() + ")")
                : Optional.empty();
    }

    @Override
    public List<String> bases() {
        return of.lines();
    }

    @Override
    public List<Clause> parts() {
        List<Clause> parts = new ArrayList<>(schedule.stream().toList());
        heading.when().ifPresent(parts::add);
        return parts;
    }
}
