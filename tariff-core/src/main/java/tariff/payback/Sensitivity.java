// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import java.math.BigDecimal;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;

/**
 * What one input does to the verdict when it alone is lower or higher than thought; a list of them, largest swing first, is a
 * tornado chart. An input of 0 stays 0 and has no swing.
 *
 * @param driver the input
 * @param low with the input at (1 − share)
 * @param high with the input at (1 + share)
 */
public record Sensitivity(Driver driver, Outcome low, Outcome high) {

    /**
     * The verdict at one end of the range.
     *
     * @param netPresentValue of yearly flows
     * @param simplePaybackYears as in {@link SimplePayback}
     */
    public record Outcome(BigDecimal netPresentValue, Answer<BigDecimal> simplePaybackYears) {}

    /** Distance between the two net present values. */
    public BigDecimal swing() {
        return high.netPresentValue().subtract(low.netPresentValue()).abs();
    }

    /**
     * All drivers, largest swing first, equal swings in the order of {@link Driver}.
     *
     * @param share by how much each is varied, 0 to 1
     * @throws tariff.notice.Refusal if the share, or an input so varied, is out of range
     */
    public static Answer<List<Sensitivity>> of(Venture venture, BigDecimal share) {
        new Checks().fraction("/share", share, "0").refuseIfAny();
        return venture.outlook()
                .discounting()
                .map(rate -> Arrays.stream(Driver.values())
                        .map(driver -> new Sensitivity(
                                driver,
                                outcome(driver.scaled(venture, BigDecimal.ONE.subtract(share)), rate),
                                outcome(driver.scaled(venture, BigDecimal.ONE.add(share)), rate)))
                        .sorted(Comparator.comparing(Sensitivity::swing).reversed())
                        .toList());
    }

    private static Outcome outcome(Venture venture, BigDecimal otherwise) {
        BigDecimal rate = venture.outlook().discountRate().orElse(otherwise);
        return new Outcome(PresentValue.of(CashFlow.of(venture).yearly(), rate), SimplePayback.years(venture));
    }
}
