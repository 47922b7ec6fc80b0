// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import tariff.meter.CutEnergies;
import tariff.meter.Unit;

/** The smallest of several quantities that can be compared: {@code { "smallest": [ … , … ] }}. */
record Smallest(List<Quantity> of) implements Quantity {

    static Quantity read(Written in) {
        return new Smallest(in.quantities("smallest"));
    }

    @Override
    public Optional<Unit> unit(Scope scope) {
        return Extreme.unit(of, scope.at("smallest"));
    }

    @Override
    public Figure value(Facts facts) {
        return Extreme.of(of, facts, -1, "smallest of ");
    }

    @Override
    public Optional<Column> column(CutEnergies parts, Facts facts) {
        return Extreme.columns(of, parts, facts, Math::min);
    }

    @Override
    public String words() {
        return "the smallest of (" + of.stream().map(Quantity::words).collect(Collectors.joining("; ")) + ")";
    }

    @Override
    public List<Quantity> parts() {
        return of;
    }
}
