// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import static java.math.BigDecimal.ONE;
import static java.math.BigDecimal.ZERO;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import tariff.notice.Finding;
import tariff.notice.Refusal;
import tariff.payback.Investment;
import tariff.payback.Outlook;
import tariff.payback.PresentValue;
import tariff.payback.Savings;
import tariff.payback.Venture;

/**
 * What a unit of money adds to the net present value of yearly flows, by where it falls. The value is a straight line in each, tax and
 * escalation included, so that four numbers stand for a whole cash flow.
 */
record Worth(BigDecimal ofCost, BigDecimal ofUpkeep, BigDecimal ofFirstYear, BigDecimal ofSettledYear) {
    private static final int YEAR = 12;

    /** @throws Refusal without a discount rate */
    static Worth of(int lifeYears, Outlook outlook) {
        return new Worth(
                value(Investment.plain(ONE, ZERO, lifeYears), ZERO, ZERO, outlook),
                value(Investment.plain(ZERO, ONE, lifeYears), ZERO, ZERO, outlook),
                value(Investment.plain(ZERO, ZERO, lifeYears), ONE, ZERO, outlook),
                value(Investment.plain(ZERO, ZERO, lifeYears), ZERO, ONE, outlook));
    }

    /** Net present value of a bank without replacements, incentives and residual value. */
    BigDecimal net(Investment bank, RepeatedYear.Saved saved) {
        return bank.netCost()
                .multiply(ofCost)
                .add(bank.yearlyUpkeep().multiply(ofUpkeep))
                .add(saved.firstYear().multiply(ofFirstYear))
                .add(saved.settledYear().multiply(ofSettledYear));
    }

    private static BigDecimal value(Investment bank, BigDecimal firstYear, BigDecimal settledYear, Outlook outlook) {
        Savings savings = new Savings(inOneMonth(firstYear), inOneMonth(settledYear));
        return PresentValue.netOfYears(new Venture(bank, savings, outlook)).fold(value -> value, why -> {
            throw new Refusal(Finding.error(
                            "discount-rate",
                            "/outlook/discountRate",
                            "is needed: the best size is the one worth most today")
                    .allowed("0 to 1, where 0.08 means 8 %"));
        });
    }

    /** A year's amount in its last month, for measures that count whole years. */
    static List<BigDecimal> inOneMonth(BigDecimal amount) {
        List<BigDecimal> year = new ArrayList<>(Collections.nCopies(YEAR - 1, ZERO));
        year.add(amount);
        return year;
    }
}
