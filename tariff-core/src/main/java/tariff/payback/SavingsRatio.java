// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static java.math.BigDecimal.ONE;
import static java.math.MathContext.DECIMAL128;

import java.math.BigDecimal;

/** Savings-to-investment ratio (SIR) and the adjusted internal rate of return (AIRR) that follows from it. */
public final class SavingsRatio {
    private SavingsRatio() {}

    /**
     * SIR = PV(savings − upkeep − tax) ÷ PV(investment + replacements − residual), yearly flows at year ends; above 1 the venture
     * pays (10 CFR 436.18 and 436.21).
     */
    public static Answer<BigDecimal> of(Venture venture) {
        return of(CashFlow.of(venture), venture.outlook());
    }

    static Answer<BigDecimal> of(CashFlow flow, Outlook outlook) {
        return outlook.discounting().flatMap(rate -> {
            BigDecimal capital = PresentValue.of(flow.yearly(Month::capital), rate);
            return capital.signum() > 0
                    ? Answer.known(
                            PresentValue.of(flow.yearly(Month::operating), rate).divide(capital, DECIMAL128))
                    : Answer.notApplicable("nothing is invested on balance, so there is no ratio to it");
        });
    }

    /** AIRR of a venture, from its SIR, discount rate and life. */
    public static Answer<BigDecimal> adjustedReturn(Venture venture) {
        return venture.outlook()
                .discounting()
                .flatMap(rate -> of(venture)
                        .flatMap(ratio ->
                                adjustedReturn(ratio, rate, venture.investment().lifeYears())));
    }

    /** AIRR = (1 + d)·SIR^(1/N) − 1: savings are reinvested at the discount rate d (10 CFR 436.22, ASTM E1057). */
    public static Answer<BigDecimal> adjustedReturn(BigDecimal ratio, BigDecimal rate, int years) {
        return ratio.signum() > 0
                ? Answer.known(ONE.add(rate)
                        .multiply(NthRoot.of(ratio, years), DECIMAL128)
                        .subtract(ONE))
                : Answer.notApplicable("savings are not positive over the life, so nothing is earned");
    }
}
