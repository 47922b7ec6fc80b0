// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import tariff.meter.Unit;

/**
 * A floor or a cap under a group of lines: what is added to reach the floor, or taken away to keep the cap. {@code { "name": "Minimum",
 * "atLeast": { "priced": … , "at": 4.10 }, "of": [ "Energy", "Demand" ] }}.
 */
record Bound(Heading heading, BaseLines of, Quantity limit, boolean floor) implements Line {

    static Bound read(Written in, Heading heading, List<String> above) {
        boolean floor = in.has("atLeast");
        if (floor && in.has("atMost")) {
            in.wrong("bound", "says both \"atLeast\" and \"atMost\"", "one of the two; write two lines");
        }
        return new Bound(heading, BaseLines.read(in, "of", above), in.quantity(floor ? "atLeast" : "atMost"), floor);
    }

    @Override
    public void check(Scope scope) {
        of.check(scope.at("of"));
        scope.at(floor ? "atLeast" : "atMost").expect(limit, Optional.of(Unit.MONEY), "it bounds an amount of");
    }

    @Override
    public Figure amount(Facts facts) {
        Figure base = of.value(facts);
        Figure edge = limit.value(facts);
        BigDecimal gap = edge.value().subtract(base.value());
        BigDecimal money = floor ? gap.max(BigDecimal.ZERO) : gap.min(BigDecimal.ZERO);
        return Figure.of(money, Unit.MONEY, "to bring {} to " + (floor ? "at least {}" : "at most {}"), base, edge);
    }

    @Override
    public String words(Scope scope) {
        return "brings " + of.words() + (floor ? " up to at least " : " down to at most ") + limit.words();
    }

    @Override
    public Optional<String> asksNothing(Set<String> nothing) {
        return floor && limit instanceof Constant constant && constant.number().signum() <= 0
                ? Optional.of("asks nothing: a floor of " + Decimals.plain(constant.number()) + " is always reached")
                : Optional.empty();
    }

    @Override
    public List<String> bases() {
        return of.lines();
    }

    @Override
    public List<Clause> parts() {
        List<Clause> parts = new ArrayList<>(List.of(limit));
        heading.when().ifPresent(parts::add);
        return parts;
    }
}
