// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static tariff.payback.Ventures.flows;
import static tariff.payback.Ventures.known;
import static tariff.payback.Ventures.money;
import static tariff.payback.Ventures.project;
import static tariff.payback.Ventures.reason;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** When the money is back, and the sentence when it is not. Own arithmetic throughout. */
class RecoveryTest {

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            -100 50 50 50        | 2 | 2 | reached to the cent at the end of month 2
            -100 50 49.99 50     | 3 | 3 | a cent short
            -100 60 60 -50 40    | 2 | 4 | a replacement takes the sum below nothing again
            -100 60 60 -20 40    | 2 | 2 | a replacement that only brings it to nothing
            0 10 10              | 0 | 0 | nothing was spent
            25 -5 10             | 0 | 0 | the incentive exceeds the cost
            """)
    void firstAndLastingMonth(String flows, int first, int lasting, String why) {
        Recovery recovery = Recovery.ofMonths(flows(flows));
        assertThat(known(recovery.first())).as(why).isEqualTo(first);
        assertThat(known(recovery.lasting())).as(why).isEqualTo(lasting);
    }

    @Test
    void saysHowMuchIsMissing() {
        Recovery never = Recovery.ofMonths(flows("-100 20 30.5"));
        assertThat(reason(never.first()))
                .isEqualTo("the cost is not recovered: 49.50 is still missing at the end of the life");
        assertThat(never.lasting()).isEqualTo(never.first());
        Recovery lost = Recovery.ofMonths(flows("-100 70 70 -60"));
        assertThat(known(lost.first())).isEqualTo(2);
        assertThat(reason(lost.lasting()))
                .isEqualTo("the cost is recovered in month 2 but not for good: "
                        + "20.00 is still missing at the end of the life");
        assertThat(reason(Recovery.ofYears(flows("-100 70 70 -60")).lasting()))
                .startsWith("the cost is recovered in year 2 but");
    }

    @Test
    void twelfthsThatDoNotEndCostNoMonth() {
        // 100/12 a month, cut off below the true twelfth, against 1200: 144 months to the day
        Venture venture = new Venture(
                Investment.plain(money("1200"), money("0"), 20),
                Savings.level(money("100").divide(money("12"), MathContext.DECIMAL128)),
                Outlook.level(money("0")));
        assertThat(known(Recovery.ofMonths(CashFlow.of(venture).monthly()).lasting()))
                .isEqualTo(144);
        assertThat(known(known(Recovery.discounted(venture)).lasting())).isEqualTo(144);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            -100 40 40 40   | 2.5  | 2 + 20/40
            -100 100 1      | 1    | the whole of year 1
            0 5             | 0    | nothing was spent
            """)
    void interpolatedYears(String flows, BigDecimal years, String arithmetic) {
        assertThat(known(Recovery.interpolatedYears(flows(flows))))
                .as(arithmetic)
                .isEqualByComparingTo(years);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            -5   | 300 | savings are not positive, so the cost is never recovered
            0    | 0   | savings are not positive, so the cost is never recovered
            1200 | 1200.004 | a settled year saves 1200.00 and its upkeep costs 1200.00, so the cost is never recovered
            240  | 300 | a settled year saves 240.00 and its upkeep costs 300.00, so the cost is never recovered
            """)
    void simplePaybackSaysWhyThereIsNone(String savings, String upkeep, String reason) {
        Venture venture = new Venture(
                Investment.plain(money("12000"), money(upkeep), 10),
                new Savings(Ventures.months("4000"), Ventures.months(savings)),
                project().outlook());
        assertThat(reason(SimplePayback.years(venture))).isEqualTo(reason);
    }

    @Test
    void simplePaybackIsNothingWhenIncentivesCoverTheCost() {
        Investment given =
                new Investment(money("1000"), money("0"), money("1100"), money("0"), 10, List.of(), money("0"));
        assertThat(known(SimplePayback.years(project().with(given)))).isEqualByComparingTo("0");
    }

    @Test
    void levelPaybackNeedsMoreThanTheInterest() {
        assertThat(reason(LevelPayback.years(money("12000"), money("960"), money("0.08"))))
                .isEqualTo("the yearly saving of 960.00 does not exceed a year's interest of 960.00 on the cost, "
                        + "so the cost is never recovered");
        assertThat(LevelPayback.years(money("12000"), money("961"), money("0.08"))
                        .optional())
                .isPresent();
        assertThat(reason(LevelPayback.years(money("12000"), money("0"), money("0.08"))))
                .isEqualTo("savings are not positive, so the cost is never recovered");
        // 12000/3700 without interest
        assertThat(known(LevelPayback.years(money("12000"), money("3700"), money("0"))))
                .isCloseTo(money("3.2432"), within(money("0.00005")));
    }
}
