// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import tariff.meter.CutEnergies;
import tariff.meter.Unit;

/** A figure in the site's contract, such as a contract demand: {@code { "agreed": "kW" }}. */
record Agreed(Unit of) implements Quantity {
    private static final Map<String, Unit> WORDS =
            new TreeMap<>(Map.of("kW", Unit.KW, "kVA", Unit.KVA, "kvar", Unit.KVAR, "kWh", Unit.KWH));

    static Quantity read(Written in) {
        return new Agreed(in.requiredWord("agreed", WORDS, Unit.KW));
    }

    @Override
    public Optional<Unit> unit(Scope scope) {
        return Optional.of(of);
    }

    @Override
    public Figure value(Facts facts) {
        return facts.agreed(of);
    }

    @Override
    public Optional<Column> column(CutEnergies parts, Facts facts) {
        return Column.constant(value(facts).value(), of, parts.size());
    }

    @Override
    public String words() {
        return "the agreed " + of.symbol();
    }
}
