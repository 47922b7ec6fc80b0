// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static tariff.payback.Ventures.known;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.apache.poi.ss.formula.functions.FinanceLib;
import org.apache.poi.ss.formula.functions.Irr;
import org.junit.jupiter.api.Test;

/** Against the spreadsheet functions of Apache POI 5.5.1, an independent implementation in doubles. */
class ReferenceTest {

    @Test
    void presentValueAgreesOverAnyFlows() {
        Random random = new Random(20_260_101);
        for (int i = 0; i < 500; i++) {
            List<BigDecimal> flows = random.doubles(1 + random.nextInt(40), -50_000, 50_000)
                    .mapToObj(BigDecimal::valueOf)
                    .toList();
            BigDecimal rate = BigDecimal.valueOf(random.nextInt(4_000) + 1, 4);
            // the reference discounts its first value by one period
            double reference = FinanceLib.npv(rate.doubleValue(), doubles(flows)) * (1 + rate.doubleValue());
            assertThat(PresentValue.of(flows, rate).doubleValue()).isCloseTo(reference, within(1e-6));
        }
    }

    @Test
    void internalReturnAgreesOverConventionalFlows() {
        Random random = new Random(20_260_102);
        for (int i = 0; i < 500; i++) {
            List<BigDecimal> flows = new ArrayList<>();
            flows.add(Ventures.cents(random, 500_000, 2_000_000).negate());
            for (int year = 5 + random.nextInt(15); year > 0; year--) {
                flows.add(Ventures.cents(random, 100_000, 600_000));
            }
            double reference = Irr.irr(doubles(flows), 0.1);
            assertThat(reference).isNotNaN();
            assertThat(known(InternalReturn.ofYears(flows)).doubleValue()).isCloseTo(reference, within(1e-7));
        }
    }

    private static double[] doubles(List<BigDecimal> flows) {
        return flows.stream().mapToDouble(BigDecimal::doubleValue).toArray();
    }
}
