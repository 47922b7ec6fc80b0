// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.math.BigDecimal;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/**
 * What the utility charged for a period: evidence to hold a recomputed statement against, never an input to it.
 *
 * @param total the amount of the bill, if known
 * @param lines amounts by the names that the bill prints, in its order; may be empty
 */
public record Charged(Optional<BigDecimal> total, Map<String, BigDecimal> lines) {
    public Charged {
        lines = Collections.unmodifiableMap(new LinkedHashMap<>(lines));
    }

    public static Charged nothingKnown() {
        return new Charged(Optional.empty(), Map.of());
    }

    public boolean isKnown() {
        return total.isPresent() || !lines.isEmpty();
    }

    public static Charged total(String amount) {
        return new Charged(Optional.of(new BigDecimal(amount)), Map.of());
    }
}
