// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import tariff.meter.Register;

/**
 * The highest demand of the period: {@code { "peak": "kVA", "in": "winter days" }}.
 *
 * @param register a demand register
 * @param window the window it is taken in, the whole period if empty
 */
record Peak(Register register, Optional<String> window) implements Metered {
    private static final Map<String, Register> WORDS = new TreeMap<>(Map.of(
            "kW", Register.PEAK_KW,
            "kVA", Register.PEAK_KVA,
            "lagging kvar", Register.PEAK_LAGGING_KVAR,
            "leading kvar", Register.PEAK_LEADING_KVAR));

    static Quantity read(Written in) {
        return new Peak(in.requiredWord("peak", WORDS, Register.PEAK_KW), in.optionalText("in"));
    }

    @Override
    public String words() {
        return "the highest " + register.words()
                + window.map(name -> " in " + name).orElse("");
    }
}
