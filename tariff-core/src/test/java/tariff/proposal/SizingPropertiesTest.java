// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import tariff.bill.Billing;
import tariff.bill.PowerFactorCost;
import tariff.correction.CapacitorBank;
import tariff.correction.Estimate;
import tariff.json.RateFile;
import tariff.meter.MeteredMonth;
import tariff.meter.Site;
import tariff.payback.Outlook;
import tariff.payback.Taxation;

/** Held against looking at every size, over invented rates, years, prices and shapes. */
class SizingPropertiesTest {
    private static final int MOST = 160;

    static IntStream seeds() {
        return IntStream.rangeClosed(1, 60);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void noWholeKvarIsBetterThanTheBest(int seed) {
        Random random = new Random(seed);
        Billing billing = new Billing(RateFile.parse(RandomYears.rate(random)), Site.unnamed());
        List<MeteredMonth> year = RandomYears.year(random);
        PriceList prices = RandomYears.prices(random);
        BankShape shape = RandomYears.shape(random);
        FreeSize choice = FreeSize.upTo(BigDecimal.valueOf(MOST), shape);
        PowerFactorCost today = PowerFactorCost.of(billing, List.of(), year);
        Weighing weighing = new Weighing(
                new RepeatedYear(billing, today, year, false, Optional.empty()), prices, RandomYears.outlook());
        Map<Estimate, BigDecimal> best = new EnumMap<>(Estimate.class);
        List<Objective> objectives = new ArrayList<>();
        for (Estimate estimate : Estimate.values()) {
            Objective objective = weighing.highestValue(estimate);
            objectives.add(objective);
            best.put(estimate, objective.at(choice.best(objective)).max(BigDecimal.ZERO));
        }
        objectives.add(weighing.shortestPayback(Estimate.values()[random.nextInt(3)]));
        objectives.add(weighing.leastRegret(best));
        for (Objective objective : objectives) {
            BigDecimal value = objective.at(choice.best(objective));
            for (int kvar = 1; kvar <= MOST; kvar++) {
                assertThat(objective.at(shape.of(BigDecimal.valueOf(kvar)))).isLessThanOrEqualTo(value);
            }
        }
    }

    /** The bill of the kindest month is a floor: no bank between two saves more than its ceiling. */
    @ParameterizedTest
    @MethodSource("seeds")
    void noBankBetweenTwoSavesMoreThanTheirCeiling(int seed) {
        Random random = new Random(seed);
        Billing billing = new Billing(RateFile.parse(RandomYears.rate(random)), Site.unnamed());
        List<MeteredMonth> year = RandomYears.year(random);
        BankShape shape = RandomYears.shape(random);
        PowerFactorCost today = PowerFactorCost.of(billing, List.of(), year);
        RepeatedYear repeated = new RepeatedYear(billing, today, year, false, Optional.empty());
        for (int draw = 0; draw < 12; draw++) {
            int from = 1 + random.nextInt(MOST);
            int to = from + random.nextInt(MOST);
            int between = from + random.nextInt(to - from + 1);
            for (Estimate estimate : Estimate.values()) {
                RepeatedYear.Saved ceiling =
                        repeated.atMost(shape.of(BigDecimal.valueOf(from)), shape.of(BigDecimal.valueOf(to)), estimate);
                CapacitorBank bank = shape.of(BigDecimal.valueOf(between));
                assertThat(repeated.saved(bank, estimate).settledYear())
                        .as("%s, %d between %d and %d kvar, %s", bank, between, from, to, estimate)
                        .isLessThanOrEqualTo(ceiling.settledYear());
            }
        }
    }

    /** What the search adds up in four numbers is what a whole cash flow gives. */
    @ParameterizedTest
    @MethodSource("seeds")
    void theValueOfASizeIsThatOfItsAssessment(int seed) {
        Random random = new Random(seed);
        Billing billing = new Billing(RateFile.parse(RandomYears.rate(random)), Site.unnamed());
        List<MeteredMonth> year = RandomYears.year(random);
        PriceList prices = RandomYears.prices(random);
        CapacitorBank bank = RandomYears.shape(random).of(BigDecimal.valueOf(80));
        Outlook outlook = new Outlook(
                Optional.of(new BigDecimal("0.07")),
                new BigDecimal("0.02"),
                new BigDecimal("0.03"),
                new BigDecimal("0.01"),
                Optional.of(new Taxation(new BigDecimal("0.25"), 5)));
        PowerFactorCost today = PowerFactorCost.of(billing, List.of(), year);
        SizedBank sized = new Weighing(new RepeatedYear(billing, today, year, false, Optional.empty()), prices, outlook)
                .sized(bank);
        Assessment assessment = Assessment.of(billing, year, new Proposal(bank, Optional.of(prices.of(bank)), outlook));
        assessment
                .appraisals()
                .forEach((estimate, appraisal) -> assertThat(
                                sized.gain(estimate).netPresentValue())
                        .isCloseTo(
                                appraisal.netPresentValue().optional().orElseThrow(), within(new BigDecimal("1e-9"))));
    }
}
