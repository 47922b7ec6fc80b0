// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static java.math.MathContext.DECIMAL128;

import java.math.BigDecimal;

/** The most that an installed bank may cost before the venture loses. */
public final class BreakEvenPrice {
    private BreakEvenPrice() {}

    /**
     * The installed cost per kvar, before incentives, at which the net present value of yearly flows is nothing; all else, also
     * incentives, replacements, upkeep and residual value, stays as it is. The value falls in a straight line with the cost, so two
     * points give the answer exactly, tax included.
     *
     * @param kvar rating of the bank, above 0
     * @throws tariff.notice.Refusal if the rating is not above 0
     */
    public static Answer<BigDecimal> perKvar(Venture venture, BigDecimal kvar) {
        Checks checks = new Checks();
        if (kvar.signum() <= 0) {
            checks.add("not-positive", "/kvar", "must be above 0", kvar.toPlainString(), "more than 0");
        }
        checks.refuseIfAny();
        return valueAt(venture, BigDecimal.ZERO)
                .flatMap(free -> valueAt(venture, kvar)
                        .flatMap(atOne -> free.signum() > 0
                                ? Answer.known(free.divide(free.subtract(atOne), DECIMAL128))
                                : Answer.notApplicable("even a bank that costs nothing would not pay: "
                                        + "its savings do not cover its later costs")));
    }

    private static Answer<BigDecimal> valueAt(Venture venture, BigDecimal installedCost) {
        return PresentValue.netOfYears(venture.with(venture.investment().costing(installedCost, BigDecimal.ZERO)));
    }
}
