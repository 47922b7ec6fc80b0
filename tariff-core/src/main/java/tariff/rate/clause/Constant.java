// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import tariff.meter.CutEnergies;
import tariff.meter.Unit;

/** A number that stands in the rate: {@code { "constant": 50, "unit": "kVA" }}; without a unit it is a plain number. */
record Constant(BigDecimal number, Unit of) implements Quantity {
    private static final Map<String, Unit> WORDS = new TreeMap<>(Map.of(
            "kWh", Unit.KWH,
            "kvarh", Unit.KVARH,
            "kVAh", Unit.KVAH,
            "kW", Unit.KW,
            "kvar", Unit.KVAR,
            "kVA", Unit.KVA,
            "days", Unit.DAYS,
            "money", Unit.MONEY));

    static Quantity read(Written in) {
        return new Constant(in.number("constant"), in.word("unit", WORDS, Unit.NUMBER));
    }

    @Override
    public Optional<Unit> unit(Scope scope) {
        return Optional.of(of);
    }

    @Override
    public Figure value(Facts facts) {
        return Figure.given(number, of, "");
    }

    @Override
    public Optional<Column> column(CutEnergies parts, Facts facts) {
        return Column.constant(number, of, parts.size());
    }

    @Override
    public String words() {
        return Decimals.plain(number) + (of.symbol().isEmpty() || of == Unit.MONEY ? "" : " " + of.symbol());
    }
}
