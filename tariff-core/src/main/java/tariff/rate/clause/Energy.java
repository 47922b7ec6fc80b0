// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import tariff.meter.CutEnergies;
import tariff.meter.Register;

/**
 * What a register counted over the period: {@code { "energy": "lagging kvarh", "in": "day" }}.
 *
 * @param register a counting register
 * @param window the window it is counted in, the whole period if empty
 */
record Energy(Register register, Optional<String> window) implements Metered {
    private static final Map<String, Register> WORDS = new TreeMap<>(Map.of(
            "kWh", Register.ENERGY_KWH,
            "lagging kvarh", Register.LAGGING_KVARH,
            "leading kvarh", Register.LEADING_KVARH,
            "kVAh", Register.APPARENT_KVAH,
            "exported kWh", Register.EXPORTED_KWH));

    static Quantity read(Written in) {
        return new Energy(in.requiredWord("energy", WORDS, Register.ENERGY_KWH), in.optionalText("in"));
    }

    @Override
    public Optional<Column> column(CutEnergies parts, Facts facts) {
        if (window.isPresent() || register == Register.APPARENT_KVAH) {
            return Optional.empty();
        }
        return Optional.of(new Column(
                register.unit(),
                parts.scale(),
                switch (register) {
                    case LAGGING_KVARH -> parts.laggingKvarh();
                    case LEADING_KVARH -> parts.leadingKvarh();
                    case EXPORTED_KWH -> parts.exportedKwh();
                    default -> parts.kwh();
                }));
    }

    @Override
    public String words() {
        return "the " + register.words() + window.map(name -> " in " + name).orElse("");
    }
}
