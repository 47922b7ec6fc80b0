// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import java.math.BigDecimal;
import java.util.Optional;

/**
 * What is expected of the years ahead. Keep nominal with nominal: a discount rate that holds inflation goes with
 * escalations that hold it too.
 *
 * <p>The first year is as given. Year t is the first year times (1 + escalation)^(t − 1), and savings also times
 * (1 − degradation)^(t − 1). Tables of escalated factors ({@link Factors#upvEscalating}) escalate the first year once already; to meet
 * them, state savings at first-year prices.
 *
 * <p>Values outside their ranges are refused, all at once, with a {@link tariff.notice.Refusal}.
 *
 * @param discountRate per year, 0 to 1; without it nothing is discounted and the discounted measures say so
 * @param savingsEscalation yearly rise of the prices that the savings are made of, −0.9 to 1
 * @param upkeepEscalation yearly rise of the upkeep, −0.9 to 1
 * @param savingsDegradation share of the savings lost each year as the bank ages, 0 to 1
 * @param taxation if the owner pays tax on the gain
 */
public record Outlook(
        Optional<BigDecimal> discountRate,
        BigDecimal savingsEscalation,
        BigDecimal upkeepEscalation,
        BigDecimal savingsDegradation,
        Optional<Taxation> taxation) {
    public Outlook {
        Checks checks = new Checks();
        discountRate.ifPresent(rate -> checks.fraction("/discountRate", rate, "0"));
        checks.fraction("/savingsEscalation", savingsEscalation, "-0.9")
                .fraction("/upkeepEscalation", upkeepEscalation, "-0.9")
                .fraction("/savingsDegradation", savingsDegradation, "0")
                .refuseIfAny();
    }

    /** Level prices, no ageing, no tax. */
    public static Outlook level(Optional<BigDecimal> discountRate) {
        return new Outlook(discountRate, BigDecimal.ZERO, BigDecimal.ZERO, BigDecimal.ZERO, Optional.empty());
    }

    public static Outlook level(BigDecimal discountRate) {
        return level(Optional.of(discountRate));
    }

    /** The discount rate, or why nothing can be discounted. */
    Answer<BigDecimal> discounting() {
        return discountRate
                .<Answer<BigDecimal>>map(Answer::known)
                .orElseGet(() -> Answer.notApplicable("no discount rate is given"));
    }

    Outlook discountedAt(BigDecimal rate) {
        return new Outlook(Optional.of(rate), savingsEscalation, upkeepEscalation, savingsDegradation, taxation);
    }

    Outlook escalatingSavings(BigDecimal escalation) {
        return new Outlook(discountRate, escalation, upkeepEscalation, savingsDegradation, taxation);
    }
}
