// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.math.BigDecimal;
import java.math.RoundingMode;

/**
 * How much of a period a series holds.
 *
 * @param expected intervals that the period has by the clock, daylight saving included
 * @param present intervals recorded
 */
public record Coverage(int expected, int present) {
    public boolean isComplete() {
        return present == expected;
    }

    /** The part that is missing, in per cent to two decimals. */
    public BigDecimal missingPercent() {
        return expected == 0
                ? BigDecimal.ZERO
                : BigDecimal.valueOf(100L * (expected - present))
                        .divide(BigDecimal.valueOf(expected), 2, RoundingMode.HALF_UP);
    }
}
