// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.util.List;
import java.util.Optional;
import java.util.function.LongBinaryOperator;
import tariff.meter.CutEnergies;
import tariff.meter.Unit;

/** What {@link Largest} and {@link Smallest} share: one of several is taken whole, with the unit of the first. */
final class Extreme {
    private Extreme() {}

    static Optional<Unit> unit(List<Quantity> of, Scope scope) {
        Optional<Unit> first = Optional.empty();
        for (int i = 0; i < of.size(); i++) {
            if (first.isEmpty()) {
                first = of.get(i).unit(scope.at(i));
            } else {
                scope.at(i).expect(of.get(i), first, "it is compared with");
            }
        }
        return first;
    }

    static Figure of(List<Quantity> of, Facts facts, int sign, String words) {
        Figure[] figures = of.stream().map(each -> each.value(facts)).toArray(Figure[]::new);
        Figure best = figures[0];
        for (Figure figure : figures) {
            if (figure.value().compareTo(best.value()) * sign > 0) {
                best = figure;
            }
        }
        return Figure.of(best.value(), figures[0].unit(), words + "{}" + ", {}".repeat(figures.length - 1), figures);
    }

    static Optional<Column> columns(List<Quantity> of, CutEnergies parts, Facts facts, LongBinaryOperator combine) {
        Optional<Column> all = of.get(0).column(parts, facts);
        for (Quantity each : of.subList(1, of.size())) {
            all = all.flatMap(sofar -> each.column(parts, facts).map(next -> sofar.with(next, combine)));
        }
        return all;
    }
}
