// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.Function;
import tariff.rate.RateSource;

/** The power factors of a rate written otherwise. */
final class PowerFactors {
    private static final String KEY = "powerFactors";

    private PowerFactors() {}

    /** Every power factor rule of the rate, changed. */
    static RateSource changed(RateSource source, Function<Map<?, ?>, Object> change) {
        if (!(source.tree().get(KEY) instanceof Map<?, ?> rules)) {
            return source;
        }
        Map<String, Object> changed = new LinkedHashMap<>();
        rules.forEach((name, rule) ->
                changed.put(String.valueOf(name), rule instanceof Map<?, ?> map ? change.apply(map) : rule));
        return source.with(KEY, changed);
    }
}
