// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.List;
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

/** Held against looking at every size, over invented rates, years, prices and shapes. */
class SizingPropertiesTest {
    private static final int MOST = 240;

    static IntStream seeds() {
        return IntStream.rangeClosed(1, 80);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void noWholeKvarIsBetterThanTheBest(int seed) {
        Random random = new Random(seed);
        Billing billing = new Billing(RateFile.parse(RandomYears.rate(random)), Site.unnamed());
        List<MeteredMonth> year = RandomYears.year(random);
        PriceList prices = RandomYears.prices(random);
        BankShape shape = RandomYears.shape(random);
        PowerFactorCost today = PowerFactorCost.of(billing, List.of(), year);
        Weighing weighing = new Weighing(new RepeatedYear(billing, today, year, false), prices, RandomYears.outlook());
        Estimate estimate = Estimate.values()[random.nextInt(3)];
        for (Objective objective : List.of(weighing.highestValue(estimate), weighing.shortestPayback(estimate))) {
            CapacitorBank best = FreeSize.upTo(BigDecimal.valueOf(MOST), shape).best(objective);
            BigDecimal value = objective.at(best);
            for (int kvar = 1; kvar <= MOST; kvar++) {
                assertThat(objective.at(shape.of(BigDecimal.valueOf(kvar)))).isLessThanOrEqualTo(value);
            }
        }
    }
}
