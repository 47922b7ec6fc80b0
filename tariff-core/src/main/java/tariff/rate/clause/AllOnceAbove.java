// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import tariff.meter.CutEnergies;
import tariff.meter.Unit;

/**
 * Nothing up to a limit, the whole quantity once above it: {@code { "all": { "energy": "leading kvarh" }, "onceAbove": … }}. At the
 * limit itself nothing is billed ("exceeds").
 */
record AllOnceAbove(Quantity of, Quantity limit) implements Quantity {

    static Quantity read(Written in) {
        return new AllOnceAbove(in.quantity("all"), in.quantity("onceAbove"));
    }

    @Override
    public Optional<Unit> unit(Scope scope) {
        Optional<Unit> unit = of.unit(scope.at("all"));
        scope.at("onceAbove").expect(limit, unit, "the limit is set for");
        return unit;
    }

    @Override
    public Figure value(Facts facts) {
        Figure whole = of.value(facts);
        Figure edge = limit.value(facts);
        boolean above = whole.value().compareTo(edge.value()) > 0;
        return Figure.of(above ? whole.value() : BigDecimal.ZERO, whole.unit(), "{}, all once above {}", whole, edge);
    }

    @Override
    public Optional<Column> column(CutEnergies parts, Facts facts) {
        return of.column(parts, facts)
                .flatMap(whole -> limit.column(parts, facts).map(edge -> whole.with(edge, (a, b) -> a > b ? a : 0)));
    }

    @Override
    public boolean needsBrackets() {
        return true;
    }

    @Override
    public String words() {
        return "all of " + of.innerWords() + " once above " + limit.innerWords();
    }

    @Override
    public Optional<Allowance> allowance() {
        return Optional.of(new Allowance(of, limit));
    }

    @Override
    public List<Clause> parts() {
        return List.of(of, limit);
    }
}
