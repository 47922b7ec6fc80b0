// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import tariff.meter.CutEnergies;
import tariff.meter.Register;
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
    public Optional<Column> column(CutEnergies parts, Facts facts) {
        return Extreme.columns(of, parts, facts, Math::max);
    }

    @Override
    public String words() {
        return "the largest of (" + of.stream().map(Quantity::words).collect(Collectors.joining("; ")) + ")";
    }

    /** The larger of kW and x × kVA is the kW from power factor x on. */
    @Override
    public Optional<BigDecimal> target() {
        boolean kw = of.stream().anyMatch(each -> each instanceof Peak peak && peak.register() == Register.PEAK_KW);
        return of.stream()
                .filter(each -> kw
                        && each instanceof Share share
                        && share.of() instanceof Peak peak
                        && peak.register() == Register.PEAK_KVA)
                .map(each -> ((Share) each).share())
                .max(BigDecimal::compareTo);
    }

    @Override
    public List<Quantity> parts() {
        return of;
    }
}
