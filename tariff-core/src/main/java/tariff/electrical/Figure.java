// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import java.util.Locale;

/** Numbers as a screen says them. */
final class Figure {
    private Figure() {}

    /** {@code 162.4 A}; no unit leaves the number alone. */
    static String of(double value, int decimals, String unit) {
        return String.format(Locale.ROOT, "%." + decimals + "f", value) + (unit.isEmpty() ? "" : " " + unit);
    }

    static String kvar(double kvar) {
        return of(kvar, 1, "kvar");
    }

    /** A share as per cent: {@code 12.5 %}. */
    static String percent(double share) {
        return of(100 * share, 1, "%");
    }
}
