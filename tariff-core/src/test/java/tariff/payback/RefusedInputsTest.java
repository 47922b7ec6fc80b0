// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static tariff.payback.Ventures.money;
import static tariff.payback.Ventures.project;

import java.util.Collections;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import tariff.notice.Refusal;

class RefusedInputsTest {

    @Test
    void everythingWrongWithAnInvestmentIsSaidAtOnce() {
        assertThatThrownBy(() -> new Investment(
                        money("-1"),
                        money("0"),
                        money("-2.50"),
                        money("0"),
                        0,
                        List.of(new Replacement(0, money("5")), new Replacement(1, money("-5"))),
                        money("-100")))
                .isInstanceOf(Refusal.class)
                .hasMessage("""
                        /purchase: is less than nothing; found -1; allowed: 0 or more
                        /incentives: is less than nothing; found -2.50; allowed: 0 or more
                        /lifeYears: is out of range; found 0; allowed: 1 to 60
                        /replacements/0/year: is out of range; found 0; allowed: 1 to 1
                        /replacements/1/cost: is less than nothing; found -5; allowed: 0 or more""");
    }

    @Test
    void aReplacementAfterTheLifeIsRefused() {
        assertThatThrownBy(() -> Ventures.withReplacement(project(), 11, "10"))
                .hasMessage("/replacements/0/year: is out of range; found 11; allowed: 1 to 10");
    }

    @Test
    void percentWrittenAsWholeNumbersIsCaught() {
        assertThatThrownBy(() -> new Outlook(
                        Optional.of(money("8")), money("3"), money("-0.95"), money("-0.01"), Optional.empty()))
                .hasMessage("""
                        /discountRate: must be a fraction of one, where 0.08 means 8 %; found 8; allowed: 0 to 1
                        /savingsEscalation: must be a fraction of one, where 0.08 means 8 %; found 3; allowed: -0.9 to 1
                        /upkeepEscalation: must be a fraction of one, where 0.08 means 8 %; found -0.95; allowed: -0.9 to 1
                        /savingsDegradation: must be a fraction of one, where 0.08 means 8 %; found -0.01; allowed: 0 to 1""");
    }

    @Test
    void savingsNeedTwelveMonths() {
        assertThatThrownBy(() -> new Savings(Collections.nCopies(11, money("1")), Collections.nCopies(13, money("1"))))
                .hasMessage("""
                        /firstYear: needs one saving for each month; found 11 months; allowed: 12 months
                        /settledYear: needs one saving for each month; found 13 months; allowed: 12 months""");
    }

    @Test
    void taxationRatingAndShareHaveRanges() {
        assertThatThrownBy(() -> new Taxation(money("25"), 61)).hasMessage("""
                        /rate: must be a fraction of one, where 0.08 means 8 %; found 25; allowed: 0 to 1
                        /depreciationYears: is out of range; found 61; allowed: 1 to 60""");
        assertThatThrownBy(() -> BreakEvenPrice.perKvar(project(), money("0")))
                .hasMessage("/kvar: must be above 0; found 0; allowed: more than 0");
        assertThatThrownBy(() -> Sensitivity.of(project(), money("20")))
                .hasMessage("/share: must be a fraction of one, where 0.08 means 8 %; found 20; allowed: 0 to 1");
    }
}
