// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SwitchingTest {

    @Test
    void inrushOfASingleBank() {
        // own arithmetic: √(2 × 25000/100) = 22.36 times 144.34 A
        double times = Inrush.isolatedTimesRated(25_000, 100, 0);
        assertThat(times).isCloseTo(22.4, within(0.05));
        assertThat(times * CapacitorCurrent.ratedAmps(100, 400)).isCloseTo(3228.0, within(1.0));
        double faultAmps = CapacitorCurrent.ratedAmps(25_000, 400);
        assertThat(Inrush.isolatedPeakAmps(faultAmps, CapacitorCurrent.ratedAmps(100, 400)))
                .isCloseTo(3228.0, within(1.0));
    }

    @Test
    void inrushOfAMediumVoltageBank() {
        // own arithmetic in the form of IEEE C37.012: 5000 kvar, 38 kV, 10 kA
        double rated = CapacitorCurrent.ratedAmps(5000, 38_000);
        assertThat(rated).isCloseTo(75.97, within(0.005));
        assertThat(Inrush.isolatedPeakAmps(10_000, rated)).isCloseTo(1233.0, within(0.5));
        assertThat(Inrush.isolatedHertz(60, 10_000, rated)).isCloseTo(688.0, within(0.5));
    }

    @ParameterizedTest(name = "{0} Hz: constant {1}")
    @CsvSource({"60, 1750", "50, 1917"})
    void backToBackInrush(double hertz, double constant) {
        // own arithmetic: √(2 × 1000 / (√3 × 2π f)) × 1000 is 1750 at 60 Hz, 1917 at 50 Hz; IEEE Std C37.99-1990 prints
        // 1747 at 60 Hz
        double byConstant = constant * Math.sqrt(13.8 * 100 * 200 / (40 * (100.0 + 200)));
        assertThat(Inrush.backToBackPeakAmps(13_800, 100, 200, 40, hertz))
                .isCloseTo(byConstant, within(byConstant * 0.002));
    }

    @Test
    void aReactorTamesTheInrush() {
        // own arithmetic: √2 / √(0.07 + 0.004)
        assertThat(Inrush.isolatedTimesRated(25_000, 100, 0.07)).isCloseTo(5.199, within(5e-4));
    }

    @ParameterizedTest(name = "{1} A, {2}: C/k {3}")
    @CsvSource(delimiter = '|', textBlock = """
            # share | A      | CT  | C/k   | source
            1       | 86.60  | 100 | 0.866 | manual of a controller: 60 kvar at 400 V, CT 500/5
            1       | 71.57  | 100 | 0.716 | same, the 60 kvar rated at 440 V
            1       | 36.08  | 100 | 0.361 | own arithmetic: 25 kvar at 400 V
            0.65    | 36.08  | 100 | 0.235 | 0.65 from memory; own arithmetic
            """)
    void controllerSetting(double share, double amps, double ratio, double ck, String source) {
        assertThat(StepControl.ck(share, amps, ratio)).as(source).isCloseTo(ck, within(6e-4));
    }

    @Test
    void deadBandIsTwoThirdsOfTheSmallestStep() {
        assertThat(StepControl.residualKvar(30)).isCloseTo(20, within(1e-9));
        assertThat(StepControl.DEAD_BAND).isGreaterThan(0.5);
        assertThatThrownBy(() -> StepControl.residualKvar(-1))
                .hasMessage("smallestStepKvar was -1.0; allowed: 0 kvar or more");
    }

    @ParameterizedTest(name = "{0} a day: {1} years")
    @CsvSource({"20, 13.7", "60, 4.6", "0, Infinity"})
    void contactorLife(double perDay, double years) {
        // own arithmetic: 100 000 / (365 n)
        if (Double.isInfinite(years)) {
            assertThat(SwitchingLife.contactorYears(perDay)).isInfinite();
        } else {
            assertThat(SwitchingLife.contactorYears(perDay)).isCloseTo(years, within(0.05));
        }
    }
}
