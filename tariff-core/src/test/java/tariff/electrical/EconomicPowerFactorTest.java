// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class EconomicPowerFactorTest {

    @ParameterizedTest(name = "{0} per kVA, {1} per kvar: {2}")
    @CsvSource(delimiter = '|', textBlock = """
            # x | y  | PF      | source
            72  | 12 | 0.98601 | Mehta & Mehta, Principles of Power System, ch. 6, ex. 6.13, p. 118
            60  | 10 | 0.98601 | second textbook, ex. 10.13
            80  | 18 | 0.97436 | second textbook, ex. 10.16
            100 | 50 | 0.86603 | Mehta & Mehta ex. 6.16, p. 120
            50  | 0  | 1.00000 | by thought: a free kvar is worth fitting to the last
            """)
    void mostEconomicalPowerFactor(double perKva, double perKvar, double pf, String source) {
        assertThat(EconomicPowerFactor.of(perKva, perKvar)).as(source).isCloseTo(pf, within(5e-6));
    }

    @ParameterizedTest(name = "{0} per kVA, {1} to {2}: {3} per kvar")
    @CsvSource(delimiter = '|', textBlock = """
            # per kVA | from       | to         | per kvar | source
            100       | 0.70       | 0.8660254  | 61.84    | Mehta & Mehta ex. 6.19, p. 124
            8000      | 0.70710678 | 0.86602540 | 4912.12  | textbook example, 45° to 30°; own check x (cos φ2 − cos φ1) / sin 15°
            """)
    void breakEvenPriceOfAKvar(double perKva, double from, double to, double perKvar, String source) {
        assertThat(EconomicPowerFactor.breakEvenPerKvar(perKva, from, to))
                .as(source)
                .isCloseTo(perKvar, within(0.01));
    }

    @Test
    void noOtherPowerFactorSavesMore() {
        double best = EconomicPowerFactor.of(72, 12);
        assertThat(saving(best)).isGreaterThan(saving(best - 0.001)).isGreaterThan(saving(best + 0.001));
    }

    private static double saving(double pf) {
        return 72 * ReleasedCapacity.kva(100, 0.8, pf) - 12 * PowerTriangle.kvarBetween(100, 0.8, pf);
    }

    @Test
    void aKvarAsDearAsAKvaIsRefused() {
        assertThatThrownBy(() -> EconomicPowerFactor.of(50, 50))
                .hasMessage("perKvarYear was 50.0; allowed: 0 or more, below perKvaYear");
        assertThatThrownBy(() -> EconomicPowerFactor.breakEvenPerKvar(100, 0.9, 0.9))
                .hasMessage("targetPf was 0.9; allowed: above presentPf, up to 1");
    }
}
