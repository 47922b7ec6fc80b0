// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SquareRootTest {

    @ParameterizedTest
    @CsvSource({
        "0, 0",
        "1, 1",
        "4, 2",
        "0.25, 0.5",
        "40000000000, 200000",
        "1.5129, 1.23",
        "1e-200, 1e-100",
        "1e300, 1e150"
    })
    void rootsThatEndAreExact(BigDecimal n, BigDecimal root) {
        assertThat(SquareRoot.of(n)).isEqualByComparingTo(root);
    }

    /** Against the JDK's own root, to 39 of 40 digits: the last may differ by one where both round. */
    @Test
    void rootsAgreeWithTheJdks() {
        Random random = new Random(20260104);
        MathContext digits = new MathContext(39);
        for (int i = 0; i < 20_000; i++) {
            BigDecimal n = new BigDecimal(random.nextDouble() + random.nextInt(1_000_000))
                    .movePointRight(random.nextInt(20) - 6)
                    .round(new MathContext(1 + random.nextInt(40)));
            BigDecimal expected = n.sqrt(new MathContext(60));
            BigDecimal error = SquareRoot.of(n).subtract(expected).abs();
            assertThat(error)
                    .isLessThanOrEqualTo(expected.ulp().max(expected.multiply(new BigDecimal("1e-39"), digits)));
        }
    }
}
