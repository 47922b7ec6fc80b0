// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class HarmonicsTest {
    private static final Map<Integer, Double> SOME = Map.of(5, 0.05, 7, 0.04, 11, 0.02, 13, 0.015);

    /** Compatibility levels of IEC 61000-2-2, from memory. */
    private static final Map<Integer, Double> LEVELS = Map.of(5, 0.06, 7, 0.05, 11, 0.035, 13, 0.03);

    private static final Map<Integer, Double> LEVELS_WITH_THIRD =
            Map.of(3, 0.03, 5, 0.06, 7, 0.05, 11, 0.035, 13, 0.03);

    @Test
    void dutyOfAPlainCapacitor() {
        // own arithmetic: sums over V1 1.00, V5 .05, V7 .04, V11 .02, V13 .015
        HarmonicDuty duty = HarmonicDuty.of(1, SOME, 0);
        assertThat(duty.rmsVoltage()).isCloseTo(1.0024, within(6e-5));
        assertThat(duty.peakVoltage()).isCloseTo(1.125, within(1e-9));
        assertThat(duty.rmsCurrent()).isCloseTo(1.1078, within(6e-5));
        assertThat(duty.kvar()).isCloseTo(1.0310, within(6e-5));
        assertThat(DutyLimits.IEEE_18.allow(duty)).isTrue();
        assertThat(DutyLimits.IEC_60831.allow(duty)).isTrue();
    }

    @Test
    void dutyAtFivePerCentOvervoltageNearsThePeakLimit() {
        // own arithmetic: V1 1.05 with the same harmonic volts
        Map<Integer, Double> same = Map.of(5, 0.05 / 1.05, 7, 0.04 / 1.05, 11, 0.02 / 1.05, 13, 0.015 / 1.05);
        HarmonicDuty duty = HarmonicDuty.of(1.05, same, 0);
        assertThat(duty.peakVoltage()).isCloseTo(1.175, within(1e-9));
        assertThat(duty.rmsCurrent()).isCloseTo(1.1532, within(6e-5));
        assertThat(duty.kvar()).isCloseTo(1.1335, within(6e-5));
        assertThat(DutyLimits.IEEE_18.allow(duty)).isTrue();
        assertThat(DutyLimits.IEEE_18.used(duty).get("peak voltage")).isGreaterThan(0.97);
    }

    @Test
    void compatibilityLevelsNearlyUseUpAPlainCapacitor() {
        // own arithmetic: √(1 + .30² + .35² + .385² + .39²) = 1.230, 95 % of 1.30
        HarmonicDuty duty = HarmonicDuty.of(1, LEVELS, 0);
        assertThat(duty.rmsCurrent()).isCloseTo(1.230, within(6e-4));
        assertThat(DutyLimits.IEC_60831.used(duty).get("rms current")).isCloseTo(0.95, within(0.005));
        assertThat(HarmonicDuty.of(1, Map.of(5, 0.05, 7, 0.03), 0).rmsCurrent()).isCloseTo(1.052, within(6e-4));
    }

    @ParameterizedTest(name = "order {0}, {1}: {2}")
    @CsvSource({"3, 0.03, 0.226", "5, 0.06, 0.372", "7, 0.05, 0.134", "11, 0.035, 0.048", "13, 0.03, 0.033"})
    void harmonicCurrentBehindASevenPerCentReactor(int order, double voltage, double current) {
        // own arithmetic: u (1 − p) / |p h − 1/h|
        assertThat(HarmonicDuty.currentShare(order, voltage, 0.07)).isCloseTo(current, within(6e-4));
        assertThat(HarmonicDuty.currentShare(order, voltage, 0)).isCloseTo(order * voltage, within(1e-12));
    }

    @Test
    void dutyBehindASevenPerCentReactor() {
        // own arithmetic, capacitor rated at the bus voltage: rms 1.081, peak 1.264; current 1.100 of the branch's own
        HarmonicDuty duty = HarmonicDuty.of(1, LEVELS_WITH_THIRD, 0.07);
        assertThat(duty.rmsVoltage()).isCloseTo(1.081, within(6e-4));
        assertThat(duty.peakVoltage()).isCloseTo(1.264, within(6e-4));
        assertThat(duty.rmsCurrent() * 0.93).isCloseTo(1.100, within(6e-4));
        assertThat(DutyLimits.IEEE_18.allow(duty)).isFalse();
        assertThat(DutyLimits.IEEE_18.allow(HarmonicDuty.of(400 / 480.0, LEVELS_WITH_THIRD, 0.07)))
                .isTrue();
    }

    @Test
    void ratedConditionsAreOneOfEverything() {
        assertThat(HarmonicDuty.of(1, Map.of(), 0)).isEqualTo(new HarmonicDuty(1, 1, 1, 1));
    }

    @ParameterizedTest(name = "{0} voltage: IEEE {1}, IEC {2}")
    @CsvSource({"1.10, true, true", "1.1001, false, false"})
    void eitherSideOfTheVoltageLimit(double ratio, boolean ieee, boolean iec) {
        HarmonicDuty duty = HarmonicDuty.of(ratio, Map.of(), 0);
        assertThat(DutyLimits.IEEE_18.allow(duty)).isEqualTo(ieee);
        assertThat(DutyLimits.IEC_60831.allow(duty)).isEqualTo(iec);
    }

    @Test
    void aBranchTunedToAHarmonicIsRefused() {
        assertThatThrownBy(() -> HarmonicDuty.of(1, Map.of(5, 0.05), 0.04))
                .hasMessage("reactorP was 0.04; allowed: not tuned to order 5");
        assertThatThrownBy(() -> HarmonicDuty.of(1, Map.of(5, -0.05), 0))
                .hasMessage("harmonics was -0.05; allowed: 0 of the fundamental or more");
    }

    @ParameterizedTest(name = "THD {0}: {1}")
    @CsvSource({
        "0.10, 0.9950",
        "0.20, 0.9806",
        "0.30, 0.9578",
        "0.40, 0.9285",
        "0.50, 0.8944",
        "0.70, 0.8192",
        "1.00, 0.7071",
        "0, 1"
    })
    void trueOverDisplacementPowerFactor(double thd, double ratio) {
        // own arithmetic: 1/√(1 + THD²)
        assertThat(Distortion.truePf(1, thd)).isCloseTo(ratio, within(6e-5));
        assertThat(Distortion.ceiling(1, thd)).isCloseTo(ratio, within(6e-5));
    }

    @Test
    void capacitorsLeaveTheHarmonicsBehind() {
        // own arithmetic: 500 kW, displacement .80, THD 25 %, 300 kvar
        PowerTriangle load = PowerTriangle.lagging(500, 0.8);
        double d = Distortion.kva(load, 0.25);
        assertThat(d).isCloseTo(156.25, within(1e-9));
        assertThat(Distortion.apparentKva(load, d)).isCloseTo(644.24, within(0.005));
        assertThat(Distortion.truePf(0.8, 0.25)).isCloseTo(0.7761, within(6e-5));
        PowerTriangle after = load.withBank(300);
        double kva = Distortion.apparentKva(after, d);
        assertThat(kva).isCloseTo(529.19, within(0.005));
        assertThat(500 / kva).isCloseTo(0.9448, within(6e-5));
        assertThat(after.powerFactor()).isCloseTo(0.9889, within(6e-5));
        assertThat(d / after.apparentKva()).isCloseTo(0.309, within(6e-4));
        assertThat(Distortion.ceiling(0.8, 0.25)).isCloseTo(0.9545, within(6e-5));
    }

    @ParameterizedTest(name = "Isc/IL {0}")
    @CsvSource(delimiter = '|', textBlock = """
            # IEEE Std 519-1992 table 10-3 as printed in Sankaran, Power Quality in Electrical Systems, fig. 2.3
            # Isc/IL | 5th  | 11th | 17th | 23rd | 35th | TDD
            19.9     | 4.0  | 2.0  | 1.5  | 0.6  | 0.3  | 5.0
            20       | 7.0  | 3.5  | 2.5  | 1.0  | 0.5  | 8.0
            99       | 10.0 | 4.5  | 4.0  | 1.5  | 0.7  | 12.0
            1000     | 12.0 | 5.5  | 5.0  | 2.0  | 1.0  | 15.0
            1001     | 15.0 | 7.0  | 6.0  | 2.5  | 1.4  | 20.0
            """)
    void currentLimits(double ratio, double h5, double h11, double h17, double h23, double h35, double tdd) {
        HarmonicCurrentLimit row = HarmonicCurrentLimit.at(ratio);
        assertThat(row.percent(5)).isEqualTo(h5).isEqualTo(row.percent(9));
        assertThat(row.percent(11)).isEqualTo(h11).isEqualTo(row.percent(15));
        assertThat(row.percent(17)).isEqualTo(h17).isEqualTo(row.percent(21));
        assertThat(row.percent(23)).isEqualTo(h23).isEqualTo(row.percent(33));
        assertThat(row.percent(35)).isEqualTo(h35).isEqualTo(row.percent(49));
        assertThat(row.totalDemandDistortionPercent()).isEqualTo(tdd);
    }

    @Test
    void evenHarmonicsHaveOtherRules() {
        assertThatThrownBy(() -> HarmonicCurrentLimit.BELOW_20.percent(6))
                .hasMessage("order was 6; allowed: an odd number from 3");
    }

    @ParameterizedTest(name = "{0} kV: {1} and {2} %")
    @CsvSource({"0.4, 5, 8", "1, 5, 8", "1.001, 3, 5", "69, 3, 5", "110, 1.5, 2.5", "161, 1.5, 2.5", "220, 1, 1.5"})
    void voltageLimits(double kilovolts, double individual, double total) {
        // IEEE Std 519-2014 table 1: up to 1 kV from a review of it, the rest from memory
        HarmonicVoltageLimit limit = HarmonicVoltageLimit.at(kilovolts);
        assertThat(limit.individualPercent()).isEqualTo(individual);
        assertThat(limit.totalPercent()).isEqualTo(total);
    }
}
