// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import tariff.meter.Unit;

/** The largest of several quantities that can be compared: {@code { "largest": [ … , … ] }}. */
record Largest(List<Quantity> of) implements Quantity {

    static Quantity read(Written in) {
        return new Largest(in.quantities("largest"));
    }

    @Override
    public Optional<Unit> unit(Scope scope) {
        return Extreme.unit(of, scope.at("largest"));
    }

    @Override
    public Figure value(Facts facts) {
        return Extreme.of(of, facts, 1, "largest of ");
    }

    @Override
    public String words() {
        return "the largest of (" + of.stream().map(Quantity::words).collect(Collectors.joining("; ")) + ")";
    }

    @Override
    public List<Quantity> parts() {
        return of;
    }
}
