// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static tariff.payback.Ventures.known;
import static tariff.payback.Ventures.money;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.function.Consumer;
import org.junit.jupiter.api.Test;

/** What holds for every conventional venture: one cost, then savings. */
class PaybackPropertiesTest {

    @Test
    void netPresentValueFallsAsTheDiscountRateRises() {
        forMany(venture -> {
            Venture dearer = venture.with(venture.outlook()
                    .discountedAt(known(venture.outlook().discounting()).add(money("0.01"))));
            if (venture.savings()
                            .settledYearTotal()
                            .compareTo(venture.investment().yearlyUpkeep())
                    > 0) {
                assertThat(known(PresentValue.netOfYears(dearer))).isLessThan(known(PresentValue.netOfYears(venture)));
                assertThat(known(PresentValue.netOfMonths(dearer)))
                        .isLessThan(known(PresentValue.netOfMonths(venture)));
            }
        });
    }

    @Test
    void paybackGrowsWithCost() {
        forMany(venture -> {
            Investment bank = venture.investment();
            Venture dearer = venture.with(bank.costing(bank.purchase().multiply(money("1.2")), bank.installation()));
            assertThat(known(SimplePayback.years(dearer))).isGreaterThan(known(SimplePayback.years(venture)));
            assertThat(paybackMonth(dearer)).isGreaterThanOrEqualTo(paybackMonth(venture));
        });
    }

    @Test
    void levelPricesWithoutAgeingGiveThePlainAnnuity() {
        forMany(venture -> {
            Investment bank = venture.investment();
            BigDecimal rate = known(venture.outlook().discounting());
            BigDecimal annuity = venture.savings()
                    .settledYearTotal()
                    .subtract(bank.yearlyUpkeep())
                    .multiply(Factors.upv(rate, bank.lifeYears()))
                    .add(bank.residual().multiply(Factors.spv(rate, bank.lifeYears())))
                    .subtract(bank.netCost());
            assertThat(known(PresentValue.netOfYears(venture))).isCloseTo(annuity, within(money("1e-20")));
        });
    }

    @Test
    void aRatchetNeverPaysBackEarlier() {
        Random random = new Random(77);
        forMany(venture -> {
            List<BigDecimal> settled = venture.savings().settledYear();
            int held = random.nextInt(12) + 1;
            List<BigDecimal> first = new ArrayList<>(Collections.nCopies(held, BigDecimal.ZERO));
            first.addAll(settled.subList(held, 12));
            Venture delayed = venture.with(new Savings(first, settled));
            assertThat(paybackMonth(delayed)).isGreaterThanOrEqualTo(paybackMonth(venture));
            assertThat(known(SimplePayback.years(delayed))).isEqualTo(known(SimplePayback.years(venture)));
            assertThat(known(PresentValue.netOfMonths(delayed))).isLessThan(known(PresentValue.netOfMonths(venture)));
        });
    }

    @Test
    void discountingNeverPaysBackEarlier() {
        forMany(venture -> assertThat(month(known(Recovery.discounted(venture)).lasting()))
                .isGreaterThanOrEqualTo(paybackMonth(venture)));
    }

    @Test
    void atTheInternalReturnFlowsAreWorthNothing() {
        forMany(venture -> {
            CashFlow flow = CashFlow.of(venture);
            InternalReturn.ofYears(flow.yearly())
                    .optional()
                    .ifPresent(rate -> assertThat(PresentValue.of(flow.yearly(), rate))
                            .isCloseTo(BigDecimal.ZERO, within(money("0.0001"))));
            InternalReturn.ofMonths(flow.monthly())
                    .optional()
                    .ifPresent(rate -> assertThat(PresentValue.of(flow.monthly(), Factors.monthlyRate(rate)))
                            .isCloseTo(BigDecimal.ZERO, within(money("0.0001"))));
        });
    }

    @Test
    void ratioAboveOneAndGainAndReturnAboveTheRateAreOneVerdict() {
        forMany(venture -> {
            boolean gains = known(PresentValue.netOfYears(venture)).signum() > 0;
            BigDecimal rate = known(venture.outlook().discounting());
            assertThat(known(SavingsRatio.of(venture)).compareTo(BigDecimal.ONE) > 0)
                    .isEqualTo(gains);
            assertThat(known(SavingsRatio.adjustedReturn(venture)).compareTo(rate) > 0)
                    .isEqualTo(gains);
            InternalReturn.ofYears(CashFlow.of(venture).yearly())
                    .optional()
                    .ifPresent(found -> assertThat(found.compareTo(rate) > 0).isEqualTo(gains));
        });
    }

    @Test
    void atTheBreakEvenPriceNothingIsGainedTaxOrNot() {
        Random random = new Random(78);
        forMany(venture -> {
            Outlook outlook = new Outlook(
                    venture.outlook().discountRate(),
                    money("0.02"),
                    money("0.03"),
                    money("0.01"),
                    Optional.of(new Taxation(money("0.25"), 1 + random.nextInt(15))));
            for (Venture each : List.of(venture, venture.with(outlook))) {
                BigDecimal price = known(BreakEvenPrice.perKvar(each, money("150")));
                Venture atPrice = each.with(each.investment().costing(price.multiply(money("150")), BigDecimal.ZERO));
                assertThat(known(PresentValue.netOfYears(atPrice))).isCloseTo(BigDecimal.ZERO, within(money("1e-20")));
            }
        });
    }

    private static int paybackMonth(Venture venture) {
        return month(Recovery.ofMonths(CashFlow.of(venture).monthly()).lasting());
    }

    /** Never is later than any month. */
    private static int month(Answer<Integer> answer) {
        return answer.optional().orElse(Integer.MAX_VALUE);
    }

    private static void forMany(Consumer<Venture> property) {
        Random random = new Random(20_260_103);
        for (int i = 0; i < 100; i++) {
            property.accept(Ventures.random(random));
        }
    }
}
