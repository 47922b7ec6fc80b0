// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.math.RoundingMode;

/** How decimals are shown to people. */
public final class Decimals {
    private static final BigDecimal HUNDRED = BigDecimal.valueOf(100);

    private Decimals() {}

    /** As written, without an exponent. */
    public static String plain(BigDecimal value) {
        return value.toPlainString();
    }

    /** At most six decimals, no trailing zeros: enough to follow a derivation with a pencil. */
    public static String shown(BigDecimal value) {
        BigDecimal shown = value.scale() > 6 ? value.setScale(6, RoundingMode.HALF_UP) : value;
        shown = shown.signum() == 0 ? BigDecimal.ZERO : shown.stripTrailingZeros();
        return shown.toPlainString();
    }

    /** A share as a percentage: {@code 0.33} reads {@code 33 %}. */
    public static String percent(BigDecimal share) {
        return shown(share.multiply(HUNDRED)) + " %";
    }
}
