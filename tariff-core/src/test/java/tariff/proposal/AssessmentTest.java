// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.LAGGING_KVARH;
import static tariff.meter.Register.LEADING_KVARH;
import static tariff.meter.Register.PEAK_KVA;
import static tariff.meter.Register.PEAK_KW;
import static tariff.meter.Register.PEAK_LAGGING_KVAR;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import tariff.bill.Billing;
import tariff.bill.Bills;
import tariff.correction.CapacitorBank;
import tariff.correction.Controller;
import tariff.correction.Estimate;
import tariff.json.RateFile;
import tariff.meter.Charged;
import tariff.meter.MeteredMonth;
import tariff.meter.Site;
import tariff.notice.Assumption;
import tariff.notice.Refusal;
import tariff.payback.Investment;
import tariff.payback.Outlook;

class AssessmentTest {
    private static final String KVA = Bills.rate("{ 'name': 'Demand', 'quantity': { 'peak': 'kVA' }, 'price': 10 }");
    private static final String RATCHET = Bills.rate("""
            { 'name': 'Demand', 'quantity': { 'largest': [ { 'peak': 'kVA' },
              { 'share': 0.8, 'of': { 'earlier': 'highest', 'of': { 'peak': 'kVA' }, 'months': 11 } } ] }, 'price': 10 }""");
    private static final String EXCESS = Bills.rate("""
            { 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'price': 0.1 },
            { 'name': 'Reactive energy', 'quantity': { 'energy': 'lagging kvarh' }, 'blocks': [
              { 'upTo': { 'share': 0.33, 'of': { 'energy': 'kWh' } }, 'price': 0 }, { 'price': 0.04 } ] },
            { 'name': 'Leading', 'quantity': { 'energy': 'leading kvarh' }, 'price': 0.04 }""");

    private static List<MeteredMonth> year() {
        List<MeteredMonth> months = new ArrayList<>();
        for (int month = 1; month <= 12; month++) {
            months.add(MeteredMonth.of(String.format("2025-%02d", month))
                    .with(ENERGY_KWH, 160_000)
                    .with(LAGGING_KVARH, 120_000)
                    .with(LEADING_KVARH, 0)
                    .with(PEAK_KW, 400)
                    .with(PEAK_KVA, 500)
                    .with(PEAK_LAGGING_KVAR, 300));
        }
        return months;
    }

    private static Assessment assess(String rate, List<MeteredMonth> months, CapacitorBank bank) {
        return Assessment.of(new Billing(RateFile.parse(rate), Site.unnamed()), months, Proposal.of(bank));
    }

    /** 150 kvar at 400 kW and 500 kVA leave 427.20 kVA: 72.80 × 10 a month with both peaks together. Own arithmetic. */
    @Test
    void aBankLowersTheKvaOfEveryMonth() {
        Assessment assessment = assess(KVA, year(), CapacitorBank.fixed("150"));
        assertThat(assessment.savings(Estimate.CENTRAL).settledYearMonths())
                .allSatisfy(saved -> assertThat(saved).isEqualByComparingTo("728.00"));
        assertThat(assessment.today().toUnity()).isEqualByComparingTo("12000");
        assertThat(assessment.today().point().words()).isEqualTo("unity (the rate bills kVA and names no other point)");
    }

    /**
     * A bank lowering 500 to 380 kVA under an 80 % ratchet of 11 months saves 12,200.00 in the first year and 14,400.00 in a settled one.
     * Common practice, no source; own arithmetic: 11 × (5,000 − 4,000) + (5,000 − 3,800), and 12 × (5,000 − 3,800).
     */
    @Test
    void theRatchetDelaysPartOfTheSavings() {
        List<MeteredMonth> year = new ArrayList<>();
        year().forEach(month -> year.add(month.with(PEAK_KW, "228")));
        CapacitorBank bank = CapacitorBank.fixed("140.981");
        BankSavings savings = assess(RATCHET, year, bank).savings(Estimate.CENTRAL);
        assertThat(savings.settledYear()
                        .get(0)
                        .lines()
                        .get(0)
                        .derivation()
                        .orElseThrow()
                        .value()
                        .doubleValue())
                .isBetween(3799.0, 3801.0);
        assertThat(savings.firstYearTotal().doubleValue()).isBetween(12_199.0, 12_201.0);
        assertThat(savings.settledYearTotal().doubleValue()).isBetween(14_390.0, 14_410.0);
    }

    /** 150 kvar over 30 days remove 60,000 to 108,000 of the 120,000 kvarh; only the 67,200 above the free share are worth money. */
    @Test
    void kvarhSavingsAreBoundedByWhatTheMonthAllows() {
        Assessment assessment = assess(EXCESS, year().subList(3, 4), CapacitorBank.automatic("150"));
        assertThat(assessment.today().penalty()).isEqualByComparingTo("2688.00");
        assertThat(assessment.savings(Estimate.HIGH).settledYearTotal()).isEqualByComparingTo("2688.00");
        // low: 60,000 kvarh removed less the dead band of 2/3 × 150 kvar over 720 h: nothing is promised; 72,000 kvarh
        // may even be sent back
        assertThat(assessment.savings(Estimate.LOW).settledYearTotal()).isLessThanOrEqualTo(BigDecimal.ZERO);
    }

    /** Fixed, low: 60,000 kvarh left and 60,000 − 120,000 + 108,000 = 48,000 sent back, charged at 0.04. Own arithmetic. */
    @Test
    void kvarhThatTheBankSendsBackAreBilled() {
        BankSavings low =
                assess(EXCESS, year().subList(3, 4), CapacitorBank.fixed("150")).savings(Estimate.LOW);
        assertThat(low.settledYear().get(0).amount("Leading")).isEqualByComparingTo("1920.00");
        assertThat(low.settledYear().get(0).amount("Reactive energy")).isEqualByComparingTo("288.00");
    }

    @ParameterizedTest
    @EnumSource(Estimate.class)
    void aBankOfNothingChangesNothing(Estimate estimate) {
        for (String rate : List.of(KVA, RATCHET, EXCESS)) {
            BankSavings savings = assess(rate, year(), CapacitorBank.fixed("0")).savings(estimate);
            assertThat(savings.firstYearTotal()).isEqualByComparingTo("0");
            assertThat(savings.settledYearTotal()).isEqualByComparingTo("0");
        }
    }

    @Test
    void theOrderOfTheMonthsDoesNotMatter() {
        List<MeteredMonth> shuffled = new ArrayList<>(year());
        Collections.shuffle(shuffled, new Random(7));
        CapacitorBank bank = CapacitorBank.fixed("120");
        assertThat(assess(RATCHET, shuffled, bank))
                .usingRecursiveComparison()
                .ignoringFields("billing")
                .isEqualTo(assess(RATCHET, year(), bank));
    }

    /** The bank's own 10 W per kvar are dearest where its steps work most; that must not turn the estimates round. */
    @Test
    void theBanksOwnLossesKeepTheEstimatesInOrder() {
        CapacitorBank lossy = CapacitorBank.automatic("150", "150")
                .withController(Controller.aimingAt(new BigDecimal("0.98")))
                .withLosses(BigDecimal.TEN);
        Assessment assessment = assess(EXCESS, year(), lossy);
        assertThat(assessment.savings(Estimate.LOW).settledYearTotal())
                .isLessThan(assessment.savings(Estimate.CENTRAL).settledYearTotal());
        assertThat(assessment.savings(Estimate.CENTRAL).settledYearTotal())
                .isLessThanOrEqualTo(assessment.savings(Estimate.HIGH).settledYearTotal());
        // April, high: all 67,200 kvarh above the free share saved at 0.04; own arithmetic on the least kvarh
        // delivered: the target leaves
        // 160,000 × tan(acos 0.98) = 32,489 kvarh and the dead band 72,000, so at least 120,000 − 104,489 = 15,511
        // kvarh × 10 W = 155 kWh
        assertThat(assessment.savings(Estimate.HIGH).settledYearMonths().get(3)).isEqualByComparingTo("2672.49");
    }

    @Test
    void lowNeverSavesMoreThanCentralNorCentralMoreThanHigh() {
        Random random = new Random(20260103);
        for (int i = 0; i < 300; i++) {
            long peak = 200 + random.nextInt(400);
            long kw = 150 + random.nextInt(450);
            long kvarh = (long) (peak * 744 * (0.1 + 0.8 * random.nextDouble()));
            MeteredMonth month = MeteredMonth.of("2025-01")
                    .with(ENERGY_KWH, kw * 400)
                    .with(LAGGING_KVARH, kvarh)
                    .with(PEAK_KW, kw)
                    .with(
                            PEAK_KVA,
                            new BigDecimal(Math.hypot(kw, peak))
                                    .setScale(1, java.math.RoundingMode.UP)
                                    .toString())
                    .with(PEAK_LAGGING_KVAR, peak);
            CapacitorBank bank = random.nextBoolean()
                    ? CapacitorBank.fixed(String.valueOf(random.nextInt(500)))
                    : CapacitorBank.automatic("25", String.valueOf(25 + random.nextInt(300)));
            Assessment assessment = assess(EXCESS, List.of(month), bank);
            assertThat(assessment.savings(Estimate.LOW).settledYearTotal())
                    .isLessThanOrEqualTo(assessment.savings(Estimate.CENTRAL).settledYearTotal());
            assertThat(assessment.savings(Estimate.CENTRAL).settledYearTotal())
                    .isLessThanOrEqualTo(assessment.savings(Estimate.HIGH).settledYearTotal());
        }
    }

    @Test
    void aMonthThatLacksWhatTheRateBillsIsRefusedByName() {
        List<MeteredMonth> months = List.of(MeteredMonth.of("2026-03").with(ENERGY_KWH, 1000));
        assertThatThrownBy(() -> assess(EXCESS, months, CapacitorBank.fixed("10")))
                .isInstanceOf(Refusal.class)
                .hasMessage("2026-03: the rate bills lagging kvarh; the bill does not give \"laggingKvarh\"");
    }

    /** 14,400 a year at 12,000: simple payback 10 months. */
    @Test
    void paybackFollowsTheCashFlowMonthByMonth() {
        Proposal proposal = new Proposal(
                CapacitorBank.fixed("150"),
                Optional.of(Investment.plain(new BigDecimal("7280"), BigDecimal.ZERO, 10)),
                Outlook.level(new BigDecimal("0.08")));
        Assessment assessment = Assessment.of(new Billing(RateFile.parse(KVA), Site.unnamed()), year(), proposal);
        assertThat(assessment
                        .appraisals()
                        .get(Estimate.CENTRAL)
                        .payback()
                        .lasting()
                        .optional())
                .contains(10);
        assertThat(assessment.whyNoPayback()).isEmpty();
    }

    /** 500 kVA × 10 = 5,000.00 a month; two of the twelve bills say 5,100.00 and 4,950.00: 150.00 of 60,050.00. Own arithmetic. */
    @Test
    void savingsRestOnBillsThatDoNotReconcile() {
        List<MeteredMonth> months = new ArrayList<>();
        year().forEach(month -> months.add(month.withCharged(Charged.total("5000.00"))));
        months.set(3, months.get(3).withCharged(Charged.total("5100.00")));
        months.set(8, months.get(8).withCharged(Charged.total("4950.00")));
        assertThat(assess(KVA, months, CapacitorBank.fixed("150")).assumptions())
                .contains(new Assumption(
                        "bills-not-reconciled",
                        "the bills",
                        "2 of 12 bills do not agree with this rate; the difference is 150.00 in all, 0.2 % of what was charged",
                        "reconcile the bills, and correct the rate or the readings"));
        assertThat(assess(KVA, year(), CapacitorBank.fixed("150")).assumptions())
                .noneMatch(assumption -> assumption.code().equals("bills-not-reconciled"));
    }
}
