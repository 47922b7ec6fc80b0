// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.math.BigDecimal;

/** How an amount that was charged stands to the one worked out; the worse, the later. */
public enum Verdict {
    /** Less than half a cent apart. */
    AGREES("agrees to the cent"),
    /** Apart by no more than the digits that the bill leaves out can explain; see {@link Slack}. */
    WITHIN_ROUNDING("agrees within rounding"),
    DIFFERS("does not agree"),
    /** Charged, but the rate has no line of this name. */
    NOT_IN_RATE("is not in the rate"),
    /** Asked by the rate, but the bill, which prints lines, prints none of this name. */
    NOT_ON_BILL("is not on the bill");

    private static final BigDecimal HALF_A_CENT = new BigDecimal("0.005");

    private final String words;

    Verdict(String words) {
        this.words = words;
    }

    public String words() {
        return words;
    }

    /** Whether it agrees, to the cent or within rounding. */
    public boolean isAgreement() {
        return this == AGREES || this == WITHIN_ROUNDING;
    }

    static Verdict of(BigDecimal difference, BigDecimal slack) {
        if (difference.abs().compareTo(HALF_A_CENT) < 0) {
            return AGREES;
        }
        return difference.abs().compareTo(slack) <= 0 ? WITHIN_ROUNDING : DIFFERS;
    }
}
