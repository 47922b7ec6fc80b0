// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.text.DecimalFormat;
import java.text.DecimalFormatSymbols;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** A figure as it is printed, digit by digit. */
final class Digits {
    private static final BigDecimal HALF = new BigDecimal("0.5");

    private Digits() {}

    /** Half a unit of the last digit: 0.5 for 400, 0.05 for 400.0. */
    static BigDecimal halfOfLast(BigDecimal value) {
        return HALF.movePointLeft(Math.max(0, value.scale()));
    }

    /** Every figure that two neighbouring digits in each other's place make of this one, with as many digits. */
    static List<BigDecimal> swapped(BigDecimal value) {
        BigDecimal plain = value.scale() < 0 ? value.setScale(0) : value;
        char[] digits = plain.unscaledValue().toString().toCharArray();
        List<BigDecimal> all = new ArrayList<>();
        for (int i = 0; i + 1 < digits.length; i++) {
            boolean leadingZero = i == 0 && digits[1] == '0';
            if (digits[i] != digits[i + 1] && !leadingZero) {
                char[] other = digits.clone();
                other[i] = digits[i + 1];
                other[i + 1] = digits[i];
                all.add(new BigDecimal(new BigInteger(new String(other)), plain.scale()));
            }
        }
        return all;
    }

    /** {@code 1,234.56}, with the decimals that the figure has. */
    static String shown(BigDecimal value) {
        int decimals = Math.max(0, value.scale());
        DecimalFormat format = new DecimalFormat("#,##0", DecimalFormatSymbols.getInstance(Locale.ROOT));
        format.setMinimumFractionDigits(decimals);
        format.setMaximumFractionDigits(decimals);
        return format.format(value);
    }
}
