// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.payback.Ventures.known;
import static tariff.payback.Ventures.money;
import static tariff.payback.Ventures.project;
import static tariff.payback.Ventures.reason;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

class MissingAnswersTest {

    @Test
    void withoutADiscountRateDiscountedMeasuresSaySoAndTheOthersStand() {
        Venture venture = Ventures.undiscounted(project());
        Appraisal appraisal = Appraisal.of(venture);
        Stream.of(
                        appraisal.discountedPayback(),
                        appraisal.netPresentValue(),
                        appraisal.netPresentValueMonthly(),
                        appraisal.modifiedReturn(),
                        appraisal.savingsToInvestment(),
                        appraisal.adjustedReturn(),
                        appraisal.annualCost(),
                        LifeCycleCost.with(venture, money("1")),
                        LifeCycleCost.without(venture, money("1")),
                        BreakEvenPrice.perKvar(venture, money("100")),
                        Sensitivity.of(venture, money("0.2")))
                .forEach(answer -> assertThat(reason(answer)).isEqualTo("no discount rate is given"));
        assertThat(appraisal.simplePaybackYears().optional()).isPresent();
        assertThat(known(appraisal.payback().lasting())).isEqualTo(39);
        assertThat(appraisal.internalReturn().optional()).isPresent();
    }

    @Test
    void aRatioNeedsSomethingInvested() {
        Investment given =
                new Investment(money("1000"), money("0"), money("1000"), money("0"), 10, List.of(), money("0"));
        assertThat(reason(SavingsRatio.of(project().with(given))))
                .isEqualTo("nothing is invested on balance, so there is no ratio to it");
    }

    @Test
    void lossesEarnNoAdjustedReturn() {
        Venture losing = project().with(Savings.level(money("-10")));
        assertThat(known(SavingsRatio.of(losing))).isNegative();
        assertThat(reason(SavingsRatio.adjustedReturn(losing)))
                .isEqualTo("savings are not positive over the life, so nothing is earned");
        assertThat(reason(BreakEvenPrice.perKvar(losing, money("100"))))
                .isEqualTo("even a bank that costs nothing would not pay: its savings do not cover its later costs");
        assertThat(reason(InternalReturn.ofMonths(CashFlow.of(losing).monthly())))
                .isEqualTo("no flow is a gain, so no rate of return recovers the cost");
    }

    @Test
    void aReasonPassesThroughWhateverIsAskedOfTheValue() {
        Answer<Integer> none = Answer.notApplicable("nothing to divide");
        assertThat(reason(none.map(value -> value + 1))).isEqualTo("nothing to divide");
        assertThat(none.optional()).isEmpty();
        assertThat(Answer.known(2).map(value -> value + 1)).isEqualTo(Answer.known(3));
        assertThat(reason(Answer.known(2).flatMap(value -> none))).isEqualTo("nothing to divide");
    }
}
