// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.math.RoundingMode;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class FactorsTest {

    // The usual present-worth tables; formulas SPV = (1+d)^-n and UPV = (1-(1+d)^-n)/d of ASTM E917 (from memory)
    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            0.03 |  5 | 0.8626 |  4.5797
            0.03 | 10 | 0.7441 |  8.5302
            0.03 | 15 | 0.6419 | 11.9379
            0.03 | 20 | 0.5537 | 14.8775
            0.05 |  5 | 0.7835 |  4.3295
            0.05 | 10 | 0.6139 |  7.7217
            0.05 | 15 | 0.4810 | 10.3797
            0.05 | 20 | 0.3769 | 12.4622
            0.08 |  5 | 0.6806 |  3.9927
            0.08 | 10 | 0.4632 |  6.7101
            0.08 | 15 | 0.3152 |  8.5595
            0.08 | 20 | 0.2145 |  9.8181
            0.10 |  5 | 0.6209 |  3.7908
            0.10 | 10 | 0.3855 |  6.1446
            0.10 | 15 | 0.2394 |  7.6061
            0.10 | 20 | 0.1486 |  8.5136
            0.12 |  5 | 0.5674 |  3.6048
            0.12 | 10 | 0.3220 |  5.6502
            0.12 | 15 | 0.1827 |  6.8109
            0.12 | 20 | 0.1037 |  7.4694
            0.15 |  5 | 0.4972 |  3.3522
            0.15 | 10 | 0.2472 |  5.0188
            0.15 | 15 | 0.1229 |  5.8474
            0.15 | 20 | 0.0611 |  6.2593
            """)
    void presentWorthTablesToFourDecimals(BigDecimal d, int n, BigDecimal spv, BigDecimal upv) {
        assertThat(Factors.spv(d, n).setScale(4, RoundingMode.HALF_UP)).isEqualByComparingTo(spv);
        assertThat(Factors.upv(d, n).setScale(4, RoundingMode.HALF_UP)).isEqualByComparingTo(upv);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            SPV  | 0.03 |      | 15 |  0.642   | NIST Handbook 135, as quoted
            UPV  | 0.03 |      | 15 | 11.94    | NIST Handbook 135, as quoted
            UPV* | 0.03 | 0.02 | 15 | 13.89    | NIST Handbook 135, as quoted
            UPV* | 0.03 | 0.02 | 15 | 13.8861  | NIST Handbook 135, formula evaluated
            UPV* | 0.03 | 0.02 |  5 |  4.8562  | NIST Handbook 135, as quoted
            UPV* | 0.08 | 0.08 |  7 |  7       | ASTM E917 (from memory): n if d = e
            UPV* | 0.08 | 0    | 10 |  6.7101  | identity: UPV if nothing escalates
            UPV  | 0    |      | 12 | 12       | ASTM E917 (from memory): n if d = 0
            UCR  | 0.08 |      | 10 |  0.14903 | ASTM E917 (from memory): 1/UPV
            UCR  | 0    |      |  8 |  0.125   | own arithmetic: 1/8
            """)
    void handbookFactors(String factor, BigDecimal d, BigDecimal e, int n, BigDecimal expected, String source) {
        BigDecimal value = switch (factor) {
            case "SPV" -> Factors.spv(d, n);
            case "UPV" -> Factors.upv(d, n);
            case "UPV*" -> Factors.upvEscalating(d, e, n);
            default -> Factors.ucr(d, n);
        };
        assertThat(value.setScale(expected.scale(), RoundingMode.HALF_UP))
                .as(source)
                .isEqualByComparingTo(expected);
    }

    @Test
    void realRateTakesInflationOutAndNominalRatePutsItBack() {
        // own arithmetic: 1.08 / 1.03 - 1 = 4.8544 %
        BigDecimal real = Factors.realRate(new BigDecimal("0.08"), new BigDecimal("0.03"));
        assertThat(real).isCloseTo(new BigDecimal("0.048544"), within(new BigDecimal("5e-7")));
        assertThat(Factors.nominalRate(real, new BigDecimal("0.03")))
                .isCloseTo(new BigDecimal("0.08"), within(new BigDecimal("1e-30")));
    }

    @Test
    void twelveMonthlyRatesCompoundToTheYearlyRateInAllDigits() {
        BigDecimal monthly = Factors.monthlyRate(new BigDecimal("0.08"));
        // own arithmetic: 1.08^(1/12) - 1 = 0.643403 %
        assertThat(monthly).isCloseTo(new BigDecimal("0.00643403"), within(new BigDecimal("5e-9")));
        assertThat(monthly.add(BigDecimal.ONE).pow(12))
                .isCloseTo(new BigDecimal("1.08"), within(new BigDecimal("1e-31")));
    }

    @Test
    void fortyPerKvarOverTenYearsAtEightPercentIsAboutSixAYear() {
        // own arithmetic: 40 x 0.1490295 = 5.961
        assertThat(Factors.ucr(new BigDecimal("0.08"), 10).multiply(new BigDecimal("40")))
                .isCloseTo(new BigDecimal("5.961"), within(new BigDecimal("0.0005")));
    }
}
