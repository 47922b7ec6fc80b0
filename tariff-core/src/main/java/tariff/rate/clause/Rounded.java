// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.util.List;
import java.util.Optional;
import tariff.meter.Unit;

/** A quantity rounded as the rate says: {@code { "rounded": …, "to": 1, "mode": "halfUp" }}. */
record Rounded(Quantity of, Rounding rounding) implements Quantity {

    static Quantity read(Written in) {
        return new Rounded(in.quantity("rounded"), Rounding.read(in));
    }

    @Override
    public Optional<Unit> unit(Scope scope) {
        return of.unit(scope.at("rounded"));
    }

    @Override
    public Figure value(Facts facts) {
        return rounding.apply(of.value(facts));
    }

    @Override
    public boolean needsBrackets() {
        return true;
    }

    @Override
    public String words() {
        return of.innerWords() + ", " + rounding.words();
    }

    @Override
    public List<Clause> parts() {
        return List.of(of);
    }
}
