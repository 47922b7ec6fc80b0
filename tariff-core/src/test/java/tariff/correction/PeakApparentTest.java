// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The highest kVA after a bank. Own derivation, checked by simulated loads. */
class PeakApparentTest {

    // P | S | c | guaranteed | both peaks together | least: own arithmetic on q0 = 510
    @ParameterizedTest
    @CsvSource({
        "680, 850, 200, 747.33, 747.33, 680",
        "680, 850, 250, 728.01, 728.01, 680",
        "680, 850, 300, 743.24, 711.69, 680",
        "680, 850, 400, 788.92, 688.84, 680",
        "680, 850, 510, 850.00, 680.00, 680",
        "400, 500, 150, 427.20, 427.20, 400",
        "400, 500, 0, 500, 500, 500"
    })
    void theUsualFormulaIsAPromiseOnlyUpToHalfOfTheReactivePeak(
            String kw, String kva, String bank, double guaranteed, double together, double least) {
        PeakApparent peak = new PeakApparent(new BigDecimal(kw), new BigDecimal(kva));
        BigDecimal c = new BigDecimal(bank);
        assertThat(peak.after(c, BigDecimal.ZERO, Estimate.LOW).doubleValue()).isCloseTo(guaranteed, within(0.005));
        assertThat(peak.after(c, BigDecimal.ZERO, Estimate.CENTRAL).doubleValue())
                .isCloseTo(together, within(0.005));
        assertThat(peak.after(c, BigDecimal.ZERO, Estimate.HIGH).doubleValue()).isCloseTo(least, within(0.005));
    }

    @Test
    void everySimulatedLoadLiesWithinTheBounds() {
        Random random = new Random(20260102);
        for (int i = 0; i < 5_000; i++) {
            double bank = random.nextDouble() * 600;
            double kw = 0;
            double kva = 0;
            double after = 0;
            double following = 0;
            for (int hour = 0; hour < 1 + random.nextInt(30); hour++) {
                double p = 500 * random.nextDouble();
                double q = 500 * random.nextDouble();
                kw = Math.max(kw, p);
                kva = Math.max(kva, Math.hypot(p, q));
                after = Math.max(after, Math.hypot(p, q - bank));
                following = Math.max(following, Math.hypot(p, Math.max(0, q - bank)));
            }
            PeakApparent peak = new PeakApparent(BigDecimal.valueOf(kw), BigDecimal.valueOf(kva));
            BigDecimal c = BigDecimal.valueOf(bank);
            assertThat(after)
                    .isLessThanOrEqualTo(
                            peak.after(c, BigDecimal.ZERO, Estimate.LOW).doubleValue() + 1e-6)
                    .isGreaterThanOrEqualTo(
                            peak.after(c, BigDecimal.ZERO, Estimate.HIGH).doubleValue() - 1e-6);
            assertThat(following)
                    .isLessThanOrEqualTo(
                            peak.after(BigDecimal.ZERO, c, Estimate.LOW).doubleValue() + 1e-6);
        }
    }
}
