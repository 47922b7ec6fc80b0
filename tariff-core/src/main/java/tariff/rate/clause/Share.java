// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import tariff.meter.CutEnergies;
import tariff.meter.Unit;

/**
 * A share of another quantity, in its unit: {@code { "share": 0.33, "of": { "energy": "kWh" } }}. Above 1 it is a factor, such as one
 * for losses; below 0 it takes away in a sum.
 */
record Share(BigDecimal share, Quantity of) implements Quantity {

    static Quantity read(Written in) {
        return new Share(in.number("share"), in.quantity("of"));
    }

    @Override
    public Optional<Unit> unit(Scope scope) {
        return of.unit(scope.at("of"));
    }

    @Override
    public Figure value(Facts facts) {
        Figure whole = of.value(facts);
        return Figure.of(share.multiply(whole.value()), whole.unit(), "{} × {}", Figure.number(share), whole);
    }

    @Override
    public Optional<Column> column(CutEnergies parts, Facts facts) {
        return of.column(parts, facts).map(whole -> whole.times(share));
    }

    @Override
    public String words() {
        return Decimals.percent(share) + " of " + of.innerWords();
    }

    @Override
    public List<Clause> parts() {
        return List.of(of);
    }
}
