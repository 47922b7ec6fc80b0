// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import tariff.meter.CutEnergies;
import tariff.meter.Unit;

/**
 * The energy of so many hours at a demand: {@code { "hours": 200, "of": "billed demand" }}, 200 kWh for each kW. Common practice for
 * energy blocks by hours of use, no source.
 */
record HoursOf(BigDecimal hours, Quantity of) implements Quantity {

    static Quantity read(Written in) {
        return new HoursOf(in.number("hours"), in.quantity("of"));
    }

    @Override
    public Optional<Unit> unit(Scope scope) {
        Optional<Unit> demand = of.unit(scope.at("of"));
        if (demand.isPresent() && demand.get().dimension() != Unit.Dimension.DEMAND) {
            scope.at("of")
                    .error("unit", "is in " + Scope.unitWords(demand.get()) + "; hours are counted of kW, kVA or kvar");
            return Optional.empty();
        }
        return demand.map(HoursOf::energy);
    }

    @Override
    public Figure value(Facts facts) {
        Figure demand = of.value(facts);
        return Figure.of(
                hours.multiply(demand.value()), energy(demand.unit()), "{} h × {}", Figure.number(hours), demand);
    }

    @Override
    public Optional<Column> column(CutEnergies parts, Facts facts) {
        return of.column(parts, facts).map(demand -> demand.times(hours).in(energy(demand.unit())));
    }

    @Override
    public String words() {
        return Decimals.plain(hours) + " hours of " + of.innerWords();
    }

    @Override
    public List<Clause> parts() {
        return List.of(of);
    }

    private static Unit energy(Unit demand) {
        return demand == Unit.KVA ? Unit.KVAH : demand == Unit.KVAR ? Unit.KVARH : Unit.KWH;
    }
}
