// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import tariff.meter.CutEnergies;
import tariff.meter.Unit;

/** Several quantities of one unit added: {@code { "sum": [ … , … ] }}. */
record Sum(List<Quantity> terms) implements Quantity {

    static Quantity read(Written in) {
        return new Sum(in.quantities("sum"));
    }

    @Override
    public Optional<Unit> unit(Scope scope) {
        Optional<Unit> first = Optional.empty();
        for (int i = 0; i < terms.size(); i++) {
            Scope here = scope.at("sum").at(i);
            Optional<Unit> unit = terms.get(i).unit(here);
            if (first.isEmpty()) {
                first = unit;
            } else if (unit.isPresent() && !unit.equals(first)) {
                here.error(
                        "unit",
                        "is in " + Scope.unitWords(unit.get()) + "; it cannot be added to "
                                + Scope.unitWords(first.get()));
            }
        }
        return first;
    }

    @Override
    public Figure value(Facts facts) {
        Figure[] figures = terms.stream().map(term -> term.value(facts)).toArray(Figure[]::new);
        BigDecimal total = BigDecimal.ZERO;
        for (Figure figure : figures) {
            total = total.add(figure.value());
        }
        return Figure.of(total, figures[0].unit(), "{}" + " + {}".repeat(figures.length - 1), figures);
    }

    @Override
    public Optional<Column> column(CutEnergies parts, Facts facts) {
        return Extreme.columns(terms, parts, facts, Math::addExact);
    }

    @Override
    public boolean needsBrackets() {
        return true;
    }

    @Override
    public String words() {
        return terms.stream().map(Quantity::innerWords).collect(Collectors.joining(" plus "));
    }

    @Override
    public List<Quantity> parts() {
        return terms;
    }
}
