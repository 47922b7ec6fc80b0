// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static tariff.meter.Register.LAGGING_KVARH;
import static tariff.meter.Register.PEAK_KVA;
import static tariff.meter.Register.PEAK_KW;
import static tariff.meter.Register.PEAK_LAGGING_KVAR;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.bill.Billing;
import tariff.bill.Bills;
import tariff.correction.CapacitorBank;
import tariff.correction.Estimate;
import tariff.json.RateFile;
import tariff.meter.MeteredMonth;
import tariff.meter.Site;
import tariff.notice.Refusal;
import tariff.payback.Answer;
import tariff.payback.Outlook;

class SizingTest {
    private static final String KVARH_ABOVE_A_THIRD = Bills.rate("""
            { 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'price': 0.1 },
            { 'name': 'Reactive energy', 'quantity': { 'energy': 'lagging kvarh' }, 'blocks': [
              { 'upTo': { 'share': 0.33, 'of': { 'energy': 'kWh' } }, 'price': 0 }, { 'price': 0.04 } ] },
            { 'name': 'Leading', 'quantity': { 'energy': 'leading kvarh' }, 'price': 0.04 }""");
    private static final Outlook UNDISCOUNTED = Outlook.level(BigDecimal.ZERO);

    private static Sizing size(String rate, List<MeteredMonth> months, SizingTerms terms) {
        return Sizing.of(new Billing(RateFile.parse(rate), Site.unnamed()), months, terms);
    }

    private static SizingTerms terms(SizeChoice choice, String perKvar, Estimate basis) {
        return new SizingTerms(choice, PriceList.perKvar(new BigDecimal(perKvar), 10), UNDISCOUNTED, basis);
    }

    private static FreeSize fixedUpTo(String kvar) {
        return FreeSize.upTo(new BigDecimal(kvar), BankShape.fixed());
    }

    private static SizedBank known(Answer<SizedBank> answer) {
        return answer.fold(bank -> bank, why -> {
            throw new AssertionError(why);
        });
    }

    private static String why(Answer<SizedBank> answer) {
        return answer.fold(bank -> "a bank of " + bank.kvar() + " kvar", why -> why);
    }

    /**
     * Under a pure kVA charge of x a year the best power factor has sin φ = y ÷ x, y being a kvar's yearly cost. Prices over 10 years
     * without interest make y. The sizes: 400 × 0.75 − 400 × tan(asin(12 ÷ 72)) = 232.39, and 200 × 0.75 − 200 × tan 30° = 34.53.
     */
    @ParameterizedTest
    @CsvSource({
        // kW, kVA, price per kVA and month, price per kvar, increment, best kvar; source
        "400, 500, 6, 120, 1, 232", // Mehta & Mehta, Principles of Power System, ex. 6.13: economic power factor
        // 0.98601
        "200, 250, 8.3333333333, 500, 0.5, 34.5", // the same, ex. 6.16: economic power factor 0.8660, 34.53 kvar
    })
    void aPureKvaChargeIsBestMetAtTheTextbookPowerFactor(
            String kw, String kva, String price, String perKvar, String increment, String best) {
        String rate = Bills.rate(
                "",
                "'roundLines': 'not', 'roundTotal': { 'to': 0.000001 },",
                "{ 'name': 'Demand', 'quantity': { 'peak': 'kVA' }, 'price': " + price + " }");
        List<MeteredMonth> year = ReviewedSite.year().stream()
                .map(month -> month.with(PEAK_KW, kw).with(PEAK_KVA, kva))
                .toList();
        FreeSize choice = new FreeSize(List.of(BankShape.fixed()), new BigDecimal(increment), new BigDecimal("240"));
        assertThat(known(size(rate, year, terms(choice, perKvar, Estimate.CENTRAL))
                                .highestValue())
                        .kvar())
                .isEqualByComparingTo(best);
    }

    /**
     * Drawn evenly, a kvar takes away 672 kvarh in February, and 67,200 are above the free share: 100 kvar. Longer months are done
     * earlier, at 744 h with 90.3 kvar. Each kvar costs 20, and in February alone 672 × 0.04 × 10 years = 268.80 are saved.
     */
    @Test
    void aThresholdIsBestMetExactly() {
        Sizing sizing = size(KVARH_ABOVE_A_THIRD, ReviewedSite.year(), terms(fixedUpTo("250"), "20", Estimate.HIGH));
        assertThat(known(sizing.highestValue()).kvar()).isEqualByComparingTo("100");
        assertThat(known(sizing.smallestWithoutPenalty()).kvar()).isEqualByComparingTo("100");
        // 12 months × 67,200 kvarh × 0.04
        assertThat(known(sizing.highestValue()).gain(Estimate.HIGH).settledYear())
                .isEqualByComparingTo("32256.00");
        assertThat(known(sizing.highestValue()).gain(Estimate.HIGH).netPresentValue())
                .isEqualByComparingTo("320560.00");
        assertThat(sizing.lines())
                .extracting(LineReach::words)
                .containsExactly(
                        "Reactive energy: saves up to 32256.00 a year, 99 % of it from 93 kvar on",
                        // beyond 120,000 kvarh ÷ 744 h
                        "Leading: costs more from 162 kvar on");
    }

    @Test
    void theCurveHoldsTheSizesAtWhichLinesStopPaying() {
        Sizing sizing = size(KVARH_ABOVE_A_THIRD, ReviewedSite.year(), terms(fixedUpTo("250"), "20", Estimate.HIGH));
        assertThat(sizing.curve())
                .extracting(point -> point.kvar().intValue())
                .contains(93, 100, 162, 250)
                .isSorted()
                .doesNotHaveDuplicates();
        assertThat(sizing.roomLimits()).isFalse();
    }

    /** All drawn at the peak of 300 kvar, 300 × (1 − 52,800 ÷ 120,000) = 168 kvar reach the free share; drawn evenly, 100 do. */
    @Test
    void whatTheBillsDoNotSayIsSaidWithWhatWouldSettleIt() {
        Sizing sizing = size(KVARH_ABOVE_A_THIRD, ReviewedSite.year(), terms(fixedUpTo("250"), "20", Estimate.CENTRAL));
        assertThat(sizing.undecided())
                .contains(new Undecided(
                        "when the kvarh were drawn decides between 100 kvar and 168 kvar; the bills do not say",
                        "interval data of kWh and kvarh settle it"));
        List<MeteredMonth> withoutPeaks = ReviewedSite.year().stream()
                .map(month -> month.with(month.totals().without(PEAK_LAGGING_KVAR)))
                .toList();
        assertThat(size(KVARH_ABOVE_A_THIRD, withoutPeaks, terms(fixedUpTo("250"), "20", Estimate.CENTRAL))
                        .undecided()
                        .map(Undecided::reading))
                .contains(
                        "the highest lagging kvar of each month narrows it; interval data of kWh and kvarh settle it");
    }

    @Test
    void noBankIsAnAnswerWithItsReason() {
        String energyAlone = Bills.rate("{ 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'price': 0.1 }");
        Sizing nothingReactive = size(energyAlone, ReviewedSite.year(), terms(fixedUpTo("50"), "20", Estimate.CENTRAL));
        assertThat(why(nothingReactive.highestValue())).isEqualTo("no bank: the rate bills nothing reactive");
        assertThat(why(nothingReactive.shortestPayback()))
                .isEqualTo("savings are not positive, so the cost is never recovered");
        assertThat(why(nothingReactive.smallestWithoutPenalty()))
                .isEqualTo("the rate names no point at which penalties end");
        assertThat(why(nothingReactive.leastRegret()))
                .isEqualTo("no bank at all is the calmest choice: at worst it forgoes 0.00");
        assertThat(nothingReactive.worstRegret()).isEqualByComparingTo("0");
        assertThat(nothingReactive.undecided()).isEmpty();

        List<MeteredMonth> good = ReviewedSite.year().stream()
                .map(month -> month.with(LAGGING_KVARH, 50_000))
                .toList();
        Sizing nothingToGain = size(KVARH_ABOVE_A_THIRD, good, terms(fixedUpTo("50"), "20", Estimate.CENTRAL));
        assertThat(why(nothingToGain.highestValue())).isEqualTo("no bank: the bills hold no cost of low power factor");
        assertThat(why(nothingToGain.smallestWithoutPenalty())).isEqualTo("no month pays a penalty today");
    }

    /** A kvar saves at most 744 × 0.04 a month and 8,760 × 0.04 × 10 = 3,504 in its life; at 4,000 none pays. */
    @Test
    void aBankThatIsTooDearIsRefusedWithThePriceAtWhichItWouldPay() {
        Sizing dear = size(KVARH_ABOVE_A_THIRD, ReviewedSite.year(), terms(fixedUpTo("50"), "4000", Estimate.HIGH));
        assertThat(why(dear.highestValue()))
                .isEqualTo(
                        "no bank: even the best size, 1 kvar at 4000.00, saves only 350.40 a year and loses 496.00 over its"
                                + " life; it would pay below 3504.00 per kvar");
    }

    /** Savings grow with the size up to 90 kvar in every month, so the largest bank of 50 is best, and more might be better. */
    @Test
    void aBankThatIsTooSmallForThePenaltySaysSo() {
        Sizing small = size(KVARH_ABOVE_A_THIRD, ReviewedSite.year(), terms(fixedUpTo("50"), "20", Estimate.HIGH));
        assertThat(small.roomLimits()).isTrue();
        assertThat(why(small.smallestWithoutPenalty()))
                .isEqualTo(
                        "no bank up to 50 kvar takes the penalty from every month; it ends at the lagging kvarh up to 33 % of"
                                + " the kWh");
    }

    /** 100 kvar of 25 and 50: two of 50 are the fewest units; price per step makes fewer better. */
    @Test
    void stepsAreChosenFromTheListOnOffer() {
        StepList list = new StepList(
                List.of(new BigDecimal("25"), new BigDecimal("50")), 4, true, false, CapacitorBank.fixed("0"));
        SizedBank best = known(size(KVARH_ABOVE_A_THIRD, ReviewedSite.year(), terms(list, "20", Estimate.HIGH))
                .highestValue());
        assertThat(best.kvar()).isEqualByComparingTo("100");
        assertThat(best.investment().netCost()).isEqualByComparingTo("2000");
    }

    /** By sum and smallest: 25/25, 50/25, 50/50, 75/25, 100/25, 100/50, 125/25, 150/50. */
    @Test
    void combinationsThatAMonthCannotTellApartAreOne() {
        StepList list = new StepList(
                List.of(new BigDecimal("25"), new BigDecimal("50")), 3, false, true, CapacitorBank.fixed("0"));
        assertThat(list.banks())
                .extracting(bank -> bank.stepsKvar().toString())
                .containsExactlyInAnyOrder(
                        "[25]",
                        "[25, 25]",
                        "[50]",
                        "[25, 50]",
                        "[25, 25, 50]",
                        "[50, 50]",
                        "[25, 50, 50]",
                        "[50, 50, 50]");
    }

    @Test
    void questionsThatCannotBeAnsweredAreRefused() {
        assertThatThrownBy(() -> size(
                        KVARH_ABOVE_A_THIRD,
                        ReviewedSite.year().subList(0, 5),
                        terms(fixedUpTo("50"), "20", Estimate.LOW)))
                .isInstanceOf(Refusal.class)
                .hasMessage("/months: the best size needs a full year; found 5 months; allowed: 12 months or more");
        assertThatThrownBy(() -> size(
                        KVARH_ABOVE_A_THIRD,
                        ReviewedSite.year(),
                        SizingTerms.of(
                                fixedUpTo("50"),
                                PriceList.perKvar(BigDecimal.TEN, 10),
                                Outlook.level(Optional.empty()))))
                .isInstanceOf(Refusal.class)
                .hasMessage(
                        "/outlook/discountRate: is needed: the best size is the one worth most today; allowed: 0 to 1, where"
                                + " 0.08 means 8 %");
        BigDecimal below = new BigDecimal("-1");
        assertThatThrownBy(() -> new PriceList(below, BigDecimal.ONE, below, BigDecimal.ONE, BigDecimal.TEN, 0))
                .isInstanceOf(Refusal.class)
                .hasMessage("""
                        /fixedPart: is less than nothing; found -1; allowed: 0 or more
                        /perSwitchedKvar: is less than nothing; found -1; allowed: 0 or more
                        /yearlyUpkeepShare: must be a fraction of one, where 0.02 means 2 %; found 10; allowed: 0 to 1
                        /lifeYears: is out of range; found 0; allowed: 1 to 60""");
        StepList endless = new StepList(
                List.of("1", "2.3", "5.7", "11.1", "23.9", "47.3").stream()
                        .map(BigDecimal::new)
                        .toList(),
                20,
                true,
                true,
                CapacitorBank.fixed("0"));
        assertThatThrownBy(endless::banks)
                .isInstanceOf(Refusal.class)
                .hasMessage(
                        "/unitsKvar: can be put together in more ways than can be looked at; found more than 2000; allowed:"
                                + " fewer units, or fewer of them in a bank");
    }
}
