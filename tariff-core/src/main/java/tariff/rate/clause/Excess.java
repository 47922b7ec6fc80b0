// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import tariff.meter.CutEnergies;
import tariff.meter.Unit;

/** What one quantity has above another, never below zero: {@code { "excess": { "peak": "lagging kvar" }, "over": … }}. */
record Excess(Quantity of, Quantity over) implements Quantity {

    static Quantity read(Written in) {
        return new Excess(in.quantity("excess"), in.quantity("over"));
    }

    @Override
    public Optional<Unit> unit(Scope scope) {
        Optional<Unit> unit = of.unit(scope.at("excess"));
        scope.at("over").expect(over, unit, "the excess is taken of");
        return unit;
    }

    @Override
    public Figure value(Facts facts) {
        Figure whole = of.value(facts);
        Figure free = over.value(facts);
        BigDecimal excess = whole.value().subtract(free.value()).max(BigDecimal.ZERO);
        return Figure.of(excess, whole.unit(), "{} above {}", whole, free);
    }

    @Override
    public Optional<Column> column(CutEnergies parts, Facts facts) {
        return of.column(parts, facts)
                .flatMap(whole -> over.column(parts, facts)
                        .map(free -> whole.with(free, (a, b) -> Math.max(0, Math.subtractExact(a, b)))));
    }

    @Override
    public boolean needsBrackets() {
        return true;
    }

    @Override
    public String words() {
        return of.innerWords() + " above " + over.innerWords();
    }

    @Override
    public Optional<Allowance> allowance() {
        return Optional.of(new Allowance(of, over));
    }

    @Override
    public List<Clause> parts() {
        return List.of(of, over);
    }
}
