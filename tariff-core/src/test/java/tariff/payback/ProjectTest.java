// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static tariff.payback.Ventures.known;
import static tariff.payback.Ventures.money;
import static tariff.payback.Ventures.project;
import static tariff.payback.Ventures.withReplacement;

import java.math.BigDecimal;
import java.util.List;
import org.junit.jupiter.api.Test;

/** 12 000 installed, 4 000 saved and 300 of upkeep a year, 10 years, 8 %; own arithmetic throughout, by the formulas named. */
class ProjectTest {
    private final Appraisal appraisal = Appraisal.of(project());

    @Test
    void simplePaybackIsCostOverNetSavings() {
        // 12000 / 3700 (10 CFR 436.23)
        close(appraisal.simplePaybackYears(), "3.2432", "0.00005");
    }

    @Test
    void discountedPaybackInClosedFormAndInterpolated() {
        // -ln(1 - 0.08 x 12000/3700) / ln 1.08; and 3 + (12000 - 3700 x 2.57710)/(3700 x 0.735030)
        close(LevelPayback.years(money("12000"), money("3700"), money("0.08")), "3.9029", "0.00005");
        List<BigDecimal> discounted = PresentValue.each(appraisal.flow().yearly(), money("0.08"));
        close(Recovery.interpolatedYears(discounted), "3.9063", "0.00005");
        assertThat(known(Recovery.ofYears(discounted).lasting())).isEqualTo(4);
    }

    @Test
    void paybackFollowsTheMonths() {
        // 333 in eleven months and 337 in the twelfth, less 25: 38 months bring 11718, the 39th 12026
        assertThat(known(appraisal.payback().first())).isEqualTo(39);
        assertThat(known(appraisal.payback().lasting())).isEqualTo(39);
        // 308.3333 x (1 - 1.00643403^-n)/0.00643403 passes 12000 between n = 44 and 45
        assertThat(known(known(appraisal.discountedPayback()).lasting())).isEqualTo(45);
    }

    @Test
    void netPresentValueOfYearsAndOfMonths() {
        // 3700 x 6.710081 - 12000
        close(appraisal.netPresentValue(), "12827.30", "0.005");
        // 308 in eleven months and 312 in each twelfth at 0.643403 % a month, less 12000
        close(appraisal.netPresentValueMonthly(), "13724.02", "0.005");
    }

    @Test
    void rates() {
        close(appraisal.internalReturn(), "0.282776", "0.0000005");
        // the same months, by bisection
        close(appraisal.internalReturnMonthly(), "0.332976", "0.0000005");
        // 10 CFR 436.22, ASTM E1057: 1.08 x 2.06894^0.1 - 1
        close(appraisal.adjustedReturn(), "0.161445", "0.0000005");
        // with level gains and one cost the same thing as AIRR
        close(appraisal.modifiedReturn(), "0.161445", "0.0000005");
    }

    @Test
    void savingsToInvestmentRatio() {
        // 10 CFR 436.21: 3700 x 6.710081 / 12000
        close(appraisal.savingsToInvestment(), "2.06894", "0.000005");
    }

    @Test
    void annualCostOfTheInvestmentAndOfEverything() {
        // 12000 x 0.1490295, and 300 more of upkeep
        close(appraisal.annualCost().map(AnnualCost::investment), "1788.35", "0.005");
        close(appraisal.annualCost().map(AnnualCost::everything), "2088.35", "0.005");
    }

    @Test
    void replacingThirtyPercentInYearEight() {
        // 12827.30 - 3600 x 1.08^-8
        Appraisal replaced = Appraisal.of(withReplacement(project(), 8, "3600"));
        close(replaced.netPresentValue(), "10882.33", "0.005");
        close(replaced.internalReturn(), "0.267469", "0.0000005");
        // 10 CFR 436.21: 24827.30 / (12000 + 1944.97)
        close(replaced.savingsToInvestment(), "1.78038", "0.00001");
    }

    @Test
    void savingsEscalatingThreePercentFromTodaysPrices() {
        // UPV* escalates the first year once: 4000 x 1.03 at first-year prices
        Venture escalating = project()
                .with(Savings.settledAtOnce(Ventures.months("4120")))
                .with(project().outlook().escalatingSavings(money("0.03")));
        close(PresentValue.netOfYears(escalating), "17093.53", "0.005");
        BigDecimal byFactors = money("4000")
                .multiply(Factors.upvEscalating(money("0.08"), money("0.03"), 10))
                .subtract(money("300").multiply(Factors.upv(money("0.08"), 10)))
                .subtract(money("12000"));
        assertThat(known(PresentValue.netOfYears(escalating))).isCloseTo(byFactors, within(money("1e-25")));
    }

    @Test
    void lifeCycleCostsDifferByTheNetPresentValueWhateverTheBills() {
        for (String bills : List.of("0", "4000", "250000")) {
            BigDecimal without =
                    known(LifeCycleCost.without(project(), money(bills))).total();
            BigDecimal with = known(LifeCycleCost.with(project(), money(bills))).total();
            // 10 CFR 436.20
            assertThat(without.subtract(with)).isCloseTo(known(appraisal.netPresentValue()), within(money("1e-24")));
        }
        // 4000 x 6.710081, and 12000 + 300 x 6.710081 with the bills gone
        close(LifeCycleCost.without(project(), money("4000")).map(LifeCycleCost::total), "26840.33", "0.005");
        close(LifeCycleCost.with(project(), money("4000")).map(LifeCycleCost::total), "14013.02", "0.005");
    }

    @Test
    void breakEvenPriceIsWhatTheNetSavingsAreWorthPerKvar() {
        // 3700 x 6.710081 / 300 kvar
        close(BreakEvenPrice.perKvar(project(), money("300")), "82.758", "0.0005");
    }

    private static void close(Answer<BigDecimal> answer, String expected, String tolerance) {
        assertThat(known(answer)).isCloseTo(money(expected), within(money(tolerance)));
    }
}
