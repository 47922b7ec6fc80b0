// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.util.List;
import java.util.Optional;
import tariff.meter.Unit;

/** Money as a quantity, for floors and caps: {@code { "priced": { "agreed": "kW" }, "at": 4.10 }}. */
record Priced(Quantity of, Price at) implements Quantity {

    static Quantity read(Written in) {
        return new Priced(in.quantity("priced"), Price.read(in, "at"));
    }

    @Override
    public Optional<Unit> unit(Scope scope) {
        at.check(scope.at("at"), of.unit(scope.at("priced")));
        return Optional.of(Unit.MONEY);
    }

    @Override
    public Figure value(Facts facts) {
        return at.charge(of.value(facts), facts);
    }

    @Override
    public String words() {
        return of.innerWords() + " at " + at.words("unit");
    }

    @Override
    public List<Clause> parts() {
        return List.of(of, at);
    }
}
