// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import java.math.BigDecimal;
import java.math.RoundingMode;

/** Figures inside a sentence: money to the hundredth, rates in percent to at most two decimals. */
final class Words {
    private Words() {}

    static String money(BigDecimal amount) {
        return amount.setScale(2, RoundingMode.HALF_UP).toPlainString();
    }

    static String percent(BigDecimal fraction) {
        BigDecimal percent = fraction.movePointRight(2).setScale(2, RoundingMode.HALF_UP);
        return percent.stripTrailingZeros().toPlainString() + " %";
    }
}
