// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Collection;
import java.util.Locale;

/** Numbers as they are written on a chart. */
final class Numbers {
    private Numbers() {}

    /** A coordinate, two decimals at most. */
    static String coordinate(double value) {
        BigDecimal rounded = BigDecimal.valueOf(value).setScale(2, RoundingMode.HALF_UP);
        return rounded.signum() == 0 ? "0" : rounded.stripTrailingZeros().toPlainString();
    }

    /** {@code −1,234.50}, with a real minus sign. */
    static String shown(double value, int decimals) {
        BigDecimal rounded = BigDecimal.valueOf(value).setScale(decimals, RoundingMode.HALF_UP);
        String size = String.format(Locale.ROOT, "%,." + decimals + "f", rounded.abs());
        return rounded.signum() < 0 ? "−" + size : size;
    }

    static String money(double value) {
        return shown(value, 2);
    }

    /** A measure with the decimals it has, one at most. */
    static String measure(double value) {
        boolean whole = Math.abs(value - Math.rint(value)) < 0.05;
        return shown(value, whole ? 0 : 1);
    }

    /** Throws {@link IllegalArgumentException} for a number that no chart can show. */
    static void check(String name, Collection<Double> values) {
        for (double value : values) {
            if (!Double.isFinite(value)) {
                throw new IllegalArgumentException(name + " holds " + value + "; a chart needs finite numbers");
            }
        }
    }
}
