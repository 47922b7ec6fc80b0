// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.math.RoundingMode;
import tariff.rate.clause.Decimals;

/** Figures inside a sentence. */
final class Words {
    private Words() {}

    /** To the hundredth: {@code 1200.00}. */
    static String money(BigDecimal amount) {
        return amount.setScale(2, RoundingMode.HALF_UP).toPlainString();
    }

    /** {@code 82.64 kvar}, to the hundredth. */
    static String kvar(BigDecimal kvar) {
        return upTo(kvar, 2) + " kvar";
    }

    /** A share as percent, to the hundredth: {@code 0.91 %}. */
    static String percent(BigDecimal share) {
        return upTo(share.movePointRight(2), 2) + " %";
    }

    /** No more decimals than these, no trailing zeros. */
    static String upTo(BigDecimal value, int decimals) {
        return Decimals.shown(value.setScale(decimals, RoundingMode.HALF_UP));
    }
}
