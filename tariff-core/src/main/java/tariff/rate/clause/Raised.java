// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import tariff.meter.Unit;

/**
 * A quantity raised by the percentage that a schedule gives: {@code { "raised": { "peak": "kW" }, "by": { "powerFactor": "billing",
 * "ratioTo": 0.95 } }} is kW × 0.95 ÷ PF below 0.95. Without a power factor it is not raised.
 */
record Raised(Quantity of, Schedule by) implements Quantity {

    static Quantity read(Written in) {
        return new Raised(in.quantity("raised"), Schedule.read(in, "by"));
    }

    @Override
    public Optional<Unit> unit(Scope scope) {
        by.check(scope.at("by"));
        return of.unit(scope.at("raised"));
    }

    @Override
    public Figure value(Facts facts) {
        Figure plain = of.value(facts);
        Optional<Figure> percent = by.value(facts);
        if (percent.isEmpty() || percent.get().value().signum() == 0) {
            return plain;
        }
        BigDecimal factor = BigDecimal.ONE.add(percent.get().value().movePointLeft(2));
        return Figure.of(plain.value().multiply(factor), plain.unit(), "{} × (1 + {} %)", plain, percent.get());
    }

    @Override
    public boolean needsBrackets() {
        return true;
    }

    @Override
    public String words() {
        return of.innerWords() + " raised by " + by.words("%");
    }

    @Override
    public List<Clause> parts() {
        return List.of(of, by);
    }
}
