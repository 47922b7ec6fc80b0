// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.util.Optional;
import tariff.meter.Unit;

/** A quantity that the rate defines once and uses by name: {@code "billed demand"}. */
public record Named(String name) implements Quantity {

    @Override
    public Optional<Unit> unit(Scope scope) {
        Quantity definition = scope.names().quantities().get(name);
        if (definition == null) {
            scope.unknown("quantity", name, scope.names().quantities().keySet());
            return Optional.empty();
        }
        Optional<Scope> inside = scope.follow(name);
        return inside.flatMap(scopeInside -> definition.unit(scopeInside.silent()));
    }

    @Override
    public Figure value(Facts facts) {
        return facts.named(name);
    }

    @Override
    public String words() {
        return name;
    }
}
