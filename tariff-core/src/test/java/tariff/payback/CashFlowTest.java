// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.payback.Ventures.money;
import static tariff.payback.Ventures.months;
import static tariff.payback.Ventures.project;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Where each amount falls. Own arithmetic throughout. */
class CashFlowTest {
    private static final BigDecimal NONE = BigDecimal.ZERO;

    @Test
    void monthZeroIsTheCostNetOfIncentivesAndTwelveMonthsFollowForEachYear() {
        Investment bank =
                new Investment(money("9000"), money("3000"), money("1500"), money("300"), 10, List.of(), money("400"));
        CashFlow flow = CashFlow.of(project().with(bank));
        assertThat(flow.months()).hasSize(121);
        assertThat(flow.monthly().get(0)).isEqualByComparingTo("-10500");
        assertThat(flow.yearly()).hasSize(11);
        assertThat(flow.yearly().get(9)).isEqualByComparingTo("3700");
        assertThat(flow.yearly().get(10)).isEqualByComparingTo("4100");
        // -10500 + 10 x 3700 + 400
        assertThat(flow.cumulative().get(120)).isEqualByComparingTo("26900");
    }

    @Test
    void theFirstYearIsAsGivenAndTheSettledYearRepeats() {
        Venture ratcheted = project().with(new Savings(months("1200"), months("4000")));
        CashFlow flow = CashFlow.of(ratcheted);
        assertThat(flow.months().get(12).savings()).isEqualByComparingTo("100");
        assertThat(flow.months().get(13).savings()).isEqualByComparingTo("333");
        assertThat(flow.months().get(24).savings()).isEqualByComparingTo("337");
        assertThat(flow.months().get(120).savings()).isEqualByComparingTo("337");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            # month | savings | upkeep | own arithmetic: 333 x (1.10 x 0.95)^(year-1), 25 x 1.04^(year-1)
            1       | 333.000000 | 25.000000
            13      | 347.985000 | 26.000000
            25      | 363.644325 | 27.040000
            """)
    void laterYearsEscalateAndAge(int month, BigDecimal savings, BigDecimal upkeep) {
        Outlook outlook = new Outlook(Optional.empty(), money("0.10"), money("0.04"), money("0.05"), Optional.empty());
        Month found = CashFlow.of(project().with(outlook)).months().get(month);
        assertThat(found.savings()).isEqualByComparingTo(savings);
        assertThat(found.upkeep()).isEqualByComparingTo(upkeep);
    }

    @Test
    void aReplacementIsPaidInTheLastMonthOfItsYear() {
        CashFlow flow = CashFlow.of(Ventures.withReplacement(project(), 8, "3600"));
        assertThat(flow.months().get(95).replacements()).isEqualByComparingTo(NONE);
        assertThat(flow.months().get(96).replacements()).isEqualByComparingTo("3600");
        // 4000 - 300 - 3600
        assertThat(flow.yearly().get(8)).isEqualByComparingTo("100");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            # written off over | tax of years 1 to 4, at 25 % on 4000 - 300 less the write-off
            4  |  175.00 |  175.00 |  175.00 | 325.00 | 3000 each year; 600 of residual value in the last
            2  | -575.00 | -575.00 |  925.00 | 1075.00 | 6000 each year, then none
            8  |  550.00 |  550.00 |  550.00 | -800.00 | 1500 each year; in the last the other 6000 too
            """)
    void taxFallsOnTheGainAfterStraightLineWriteOff(
            int years, BigDecimal first, BigDecimal second, BigDecimal third, BigDecimal fourth, String arithmetic) {
        Investment bank = new Investment(money("12000"), NONE, NONE, money("300"), 4, List.of(), money("600"));
        Outlook taxed =
                new Outlook(Optional.empty(), NONE, NONE, NONE, Optional.of(new Taxation(money("0.25"), years)));
        List<BigDecimal> tax = CashFlow.of(project().with(bank).with(taxed)).yearly(Month::tax).stream()
                .map(amount -> amount.setScale(2, RoundingMode.HALF_UP))
                .toList();
        assertThat(tax)
                .as(arithmetic)
                .usingElementComparator(BigDecimal::compareTo)
                .containsExactly(NONE, first, second, third, fourth);
    }

    @Test
    void taxOverTheLifeIsTheRateOnTheWholeGainHoweverItIsWrittenOff() {
        for (int years : new int[] {1, 3, 10, 25}) {
            Outlook taxed =
                    new Outlook(Optional.empty(), NONE, NONE, NONE, Optional.of(new Taxation(money("0.3"), years)));
            BigDecimal total = CashFlow.of(project().with(taxed)).yearly(Month::tax).stream()
                    .reduce(NONE, BigDecimal::add);
            // 0.3 x (37000 - 12000)
            assertThat(total.setScale(20, RoundingMode.HALF_UP)).isEqualByComparingTo("7500");
        }
    }
}
