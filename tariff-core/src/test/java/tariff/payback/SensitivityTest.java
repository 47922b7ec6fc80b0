// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static tariff.payback.Ventures.known;
import static tariff.payback.Ventures.money;
import static tariff.payback.Ventures.project;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Comparator;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SensitivityTest {

    @Test
    void largestSwingComesFirstAndAnInputOfNothingHasNone() {
        List<Sensitivity> tornado = known(Sensitivity.of(project(), money("0.2")));
        assertThat(tornado)
                .extracting(Sensitivity::driver)
                .containsExactly(Driver.SAVINGS, Driver.COST, Driver.DISCOUNT_RATE, Driver.UPKEEP, Driver.ESCALATION);
        assertThat(tornado)
                .isSortedAccordingTo(Comparator.comparing(Sensitivity::swing).reversed());
        assertThat(tornado.get(4).swing()).isEqualByComparingTo("0");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            SAVINGS       | 7459.24 | 18195.37 | 4.1379 | 2.6667 | (3200 or 4800 - 300) x 6.710081 - 12000; 12000/2900, 12000/4500
            COST          | 15227.30 | 10427.30 | 2.5946 | 3.8919 | 24827.30 less 9600 or 14400; 9600/3700, 14400/3700
            DISCOUNT_RATE | 14723.59 | 11130.87 | 3.2432 | 3.2432 | 3700 x UPV at 6.4 or 9.6 % - 12000
            UPKEEP        | 13229.91 | 12424.70 | 3.1915 | 3.2967 | 12827.30 plus or less 60 x 6.710081; 12000/3760, 12000/3640
            """)
    void oneInputTwentyPercentEitherWay(
            Driver driver, BigDecimal low, BigDecimal high, BigDecimal lowYears, BigDecimal highYears, String how) {
        Sensitivity row = known(Sensitivity.of(project(), money("0.2"))).stream()
                .filter(each -> each.driver() == driver)
                .findAny()
                .orElseThrow();
        assertThat(row.low().netPresentValue()).as(how).isCloseTo(low, within(money("0.005")));
        assertThat(row.high().netPresentValue()).as(how).isCloseTo(high, within(money("0.005")));
        assertThat(known(row.low().simplePaybackYears())).as(how).isCloseTo(lowYears, within(money("0.00005")));
        assertThat(known(row.high().simplePaybackYears())).as(how).isCloseTo(highYears, within(money("0.00005")));
    }

    @Test
    void escalationCountsFromTheSecondYear() {
        Venture escalating = project().with(project().outlook().escalatingSavings(money("0.05")));
        Sensitivity row = known(Sensitivity.of(escalating, money("1"))).stream()
                .filter(each -> each.driver() == Driver.ESCALATION)
                .findAny()
                .orElseThrow();
        // at nothing the plain project; at 10 % 4000/1.10 x UPV*(8 %, 10 %, 10) - 300 x UPV - 12000
        assertThat(row.low().netPresentValue()).isCloseTo(money("12827.30"), within(money("0.005")));
        BigDecimal high = money("4000")
                .divide(money("1.1"), MathContext.DECIMAL128)
                .multiply(Factors.upvEscalating(money("0.08"), money("0.1"), 10))
                .subtract(money("300").multiply(Factors.upv(money("0.08"), 10)))
                .subtract(money("12000"));
        assertThat(row.high().netPresentValue()).isCloseTo(high, within(money("1e-24")));
    }
}
