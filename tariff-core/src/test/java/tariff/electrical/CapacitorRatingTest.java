// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

class CapacitorRatingTest {

    @ParameterizedTest(name = "{0} kvar at {2} V on {1} V, {3} of {4} Hz: {5} kvar")
    @CsvSource(delimiter = '|', textBlock = """
            # kvar | on V | rated V | Hz | rated Hz | kvar   | source
            100    | 460  | 480     | 60 | 60       | 91.84  | own arithmetic: 100 × (460/480)²
            100    | 208  | 240     | 60 | 60       | 75.11  | own arithmetic: 100 × (208/240)²
            100    | 400  | 525     | 50 | 50       | 58.05  | own arithmetic: 100 × (400/525)²
            100    | 400  | 440     | 50 | 50       | 82.64  | own arithmetic: 100 × (400/440)²
            100    | 420  | 400     | 50 | 50       | 110.25 | own arithmetic: 100 × 1.05²
            100    | 400  | 400     | 50 | 60       | 83.33  | own arithmetic: 100 × 50/60
            100    | 400  | 400     | 50 | 50       | 100.00 | by thought: at its rating
            0      | 400  | 400     | 50 | 50       | 0.00   | by thought: no bank
            """)
    void kvarAwayFromTheRating(
            double rated, double volts, double ratedVolts, double hz, double ratedHz, double kvar, String source) {
        assertThat(EffectiveKvar.of(rated, volts, ratedVolts, 0, hz, ratedHz))
                .as(source)
                .isCloseTo(kvar, within(0.005));
    }

    @ParameterizedTest(name = "p {0}")
    @CsvSource(delimiter = '|', textBlock = """
            # p    | n     | 50 Hz | 60 Hz | at 400 V | at 480 V | source
            0.05   | 4.472 | 223.6 | 268.3 | 421.1    | 505.3    | own arithmetic
            0.0567 | 4.200 | 210.0 | 252.0 | 424.0    | 508.9    | own arithmetic
            0.06   | 4.082 | 204.1 | 244.9 | 425.5    | 510.6    | 425.5 V an article on erbar.id; the rest own arithmetic
            0.07   | 3.780 | 189.0 | 226.8 | 430.1    | 516.1    | 189 Hz a reactor maker and a calculation sheet; the rest own arithmetic
            0.08   | 3.536 | 176.8 | 212.1 | 434.8    | 521.7    | 434.783 V Darma Agung journal, abstract; the rest own arithmetic
            0.125  | 2.828 | 141.4 | 169.7 | 457.1    | 548.6    | own arithmetic
            0.14   | 2.673 | 133.6 | 160.4 | 465.1    | 558.1    | own arithmetic
            """)
    void detuningReactors(double p, double n, double at50, double at60, double at400, double at480, String source) {
        assertThat(Detuning.order(p)).as(source).isCloseTo(n, within(5e-4));
        assertThat(Detuning.hertz(p, 50)).as(source).isCloseTo(at50, within(0.06));
        assertThat(Detuning.hertz(p, 60)).as(source).isCloseTo(at60, within(0.06));
        assertThat(Detuning.capacitorVolts(400, p)).as(source).isCloseTo(at400, within(0.06));
        assertThat(Detuning.capacitorVolts(480, p)).as(source).isCloseTo(at480, within(0.06));
    }

    @Test
    void aReactorRaisesTheKvarAtTheBus() {
        // own arithmetic: 58.05 / 0.93
        assertThat(EffectiveKvar.of(100, 400, 525, 0.07)).isCloseTo(62.42, within(0.005));
    }

    @Test
    void withoutAReactorTheCapacitorSeesTheBus() {
        assertThat(Detuning.capacitorVolts(400, 0)).isEqualTo(400);
        assertThatThrownBy(() -> Detuning.order(0)).hasMessage("reactorP was 0.0; allowed: above 0, below 1");
        assertThatThrownBy(() -> EffectiveKvar.of(100, 400, 400, 7))
                .hasMessage("reactorP was 7.0; allowed: 0 (no reactor) or more, below 1");
    }

    @ParameterizedTest
    @EnumSource
    void everyToleranceHoldsTheRatingAndNamesItsEdition(CapacitanceTolerance tolerance) {
        assertThat(tolerance.low()).isLessThanOrEqualTo(1);
        assertThat(tolerance.high()).isGreaterThan(1);
        assertThat(tolerance.edition()).containsPattern("(60831-1|Std 18)[:-](1992|1996|2012|2014)");
    }

    @Test
    void tolerancesByEdition() {
        // IEEE Std 18-1992, excerpt on capacitance tests: 100 to 115 %; IEC 60831-1:2014 from memory
        assertThat(CapacitanceTolerance.IEEE_18_1992.high()).isEqualTo(1.15);
        assertThat(CapacitanceTolerance.IEC_60831_2014_UP_TO_100_KVAR.low()).isEqualTo(0.95);
        assertThat(CapacitanceTolerance.IEC_60831_2014_UP_TO_100_KVAR.high()).isEqualTo(1.10);
        assertThat(CapacitanceTolerance.IEC_60831_2014_ABOVE_100_KVAR.high()).isEqualTo(1.05);
    }

    @Test
    void microfaradsOfABankAtAMotor() {
        // Gönen p. 393: 168.46 kvar, 4.16 kV, 60 Hz
        assertThat(Capacitance.deltaMicrofarads(168.46, 4160, 60)).isCloseTo(8.607, within(5e-4));
        assertThat(Capacitance.starMicrofarads(168.46, 4160, 60)).isCloseTo(25.82, within(5e-3));
        assertThat(CapacitorCurrent.ratedAmps(168.46, 4160)).isCloseTo(23.38, within(5e-3));
    }

    @ParameterizedTest(name = "{0} kvar at {1} V: {2} A, {3} times that {4} A")
    @CsvSource(delimiter = '|', textBlock = """
            # kvar | V   | A      | factor | A      | source
            100    | 480 | 120.28 | 1.35   | 162.38 | NEC 460.8(A) factor (EC&M); own arithmetic
            100    | 400 | 144.34 | 1.30   | 187.6  | IEC 60831-1:2014 from memory; own arithmetic
            100    | 400 | 144.34 | 1.43   | 206.4  | IEC 60831-1:2014 from memory; own arithmetic
            100    | 400 | 144.34 | 1.50   | 216.5  | IEC 60831-1:1996 from memory; own arithmetic
            60     | 400 | 86.60  | 1.00   | 86.60  | manual of a controller
            25     | 400 | 36.08  | 1.00   | 36.08  | own arithmetic: 25000 / (√3 × 400)
            """)
    void currents(double kvar, double volts, double amps, double factor, double times, String source) {
        assertThat(CapacitorCurrent.ratedAmps(kvar, volts)).as(source).isCloseTo(amps, within(0.006));
        assertThat(factor * CapacitorCurrent.ratedAmps(kvar, volts)).as(source).isCloseTo(times, within(0.06));
    }

    @Test
    void currentFactorsByStandard() {
        assertThat(CapacitorCurrent.NEC_FACTOR).isEqualTo(1.35);
        assertThat(CapacitorCurrent.IEC_FACTOR).isEqualTo(1.30);
        assertThat(CapacitorCurrent.IEC_FACTOR_WITH_TOLERANCE).isCloseTo(1.30 * 1.10, within(1e-9));
        assertThat(CapacitorCurrent.IEC_FACTOR_1996).isCloseTo(1.30 * 1.15, within(0.006));
    }

    @Test
    void conductorOnAMotorCircuit() {
        // EC&M quiz on NEC 460.8(A): 20 A capacitor, 8 AWG of 55 A: 27 A governs over 18.33 A
        assertThat(CapacitorCurrent.motorCircuitConductorAmps(20, 55)).isCloseTo(27, within(1e-9));
        assertThat(CapacitorCurrent.motorCircuitConductorAmps(5, 55)).isCloseTo(55 / 3.0, within(1e-9));
    }

    @Test
    void motorTerminals() {
        // 90 % rule, own arithmetic: 0.9 × √3 × 400 × 30 / 1000; 25 % Electrical Installation Guide 2008, p. L11
        assertThat(MotorTerminal.largestKvar(400, 30)).isCloseTo(18.7, within(0.01));
        assertThat(MotorTerminal.estimateKvar(55)).isEqualTo(13.75);
        assertThat(MotorTerminal.overloadSettingRatio(0.80, 0.95)).isCloseTo(0.842, within(5e-4));
        assertThatThrownBy(() -> MotorTerminal.largestKvar(400, 0))
                .hasMessage("noLoadAmps was 0.0; allowed: above 0 A");
    }

    @ParameterizedTest(name = "{0} kvar at {1} Hz: {2} J")
    @CsvSource(delimiter = '|', textBlock = """
            # kvar | Hz | J     | source
            100    | 60 | 132.6 | own arithmetic: 100000 / (2 × 2π × 60)
            300    | 50 | 477.5 | own arithmetic: 300000 / (2 × 2π × 50)
            0      | 50 | 0     | by thought
            """)
    void storedEnergy(double kvar, double hertz, double joules, String source) {
        assertThat(StoredEnergy.joules(kvar, hertz)).as(source).isCloseTo(joules, within(0.06));
    }

    @Test
    void dischargeIsFastEnough() {
        // own arithmetic: 60 / ln(√2 × 480 / 50), 180 / ln(√2 × 400 / 75)
        assertThat(StoredEnergy.longestTimeConstantSeconds(480, StoredEnergy.Residual.NEC_LOW_VOLTAGE))
                .isCloseTo(23.0, within(0.05));
        assertThat(StoredEnergy.longestTimeConstantSeconds(400, StoredEnergy.Residual.IEC_60831))
                .isCloseTo(89.1, within(0.05));
        // own arithmetic: ln(14.142) = 2.649 time constants down to 10 %
        assertThat(StoredEnergy.reconnectionSeconds(23.0)).isCloseTo(60.9, within(0.05));
        assertThatThrownBy(() -> StoredEnergy.longestTimeConstantSeconds(24, StoredEnergy.Residual.NEC_LOW_VOLTAGE))
                .hasMessage("ratedVolts was 24.0; allowed: a crest above 50.0 V");
    }

    @ParameterizedTest(name = "{0} of rated voltage: {1} of the life")
    @CsvSource(delimiter = '|', textBlock = """
            # U/Un | life | source
            1.10   | 0.42 | note quoting a maker: (230/253)⁹ = 42 %
            1.08   | 0.50 | own arithmetic: 1.08⁻⁹
            1.05   | 0.64 | own arithmetic: 1.05⁻⁹
            1.00   | 1.00 | by thought: rated
            """)
    void lifeUnderVoltage(double ratio, double life, String source) {
        assertThat(Life.voltageFactor(ratio)).as(source).isCloseTo(life, within(0.006));
    }

    @Test
    void lifeHalvesForTenKelvin() {
        assertThat(Life.temperatureFactor(0)).isEqualTo(1);
        assertThat(Life.temperatureFactor(10)).isEqualTo(0.5);
        assertThat(Life.temperatureFactor(20)).isEqualTo(0.25);
        assertThat(Life.temperatureFactor(-10)).isEqualTo(2);
    }

    @ParameterizedTest(name = "{0} of rated voltage: IEC {1}, IEEE {2}")
    @CsvSource(delimiter = '|', textBlock = """
            # U/Un  | IEC 60831-1     | IEEE 18-2002
            1.00    | continuously    | continuously
            1.001   | 8 h in 24 h     | continuously
            1.10    | 8 h in 24 h     | continuously
            1.11    | 30 min in 24 h  | 30 min
            1.20    | 5 min           | 30 min
            1.30    | 1 min           | 1 min
            1.31    | never           | 15 s
            2.20    | never           | 0.1 s
            2.21    | never           | never
            """)
    void howLongACapacitorMayStandAVoltage(double ratio, String iec, String ieee) {
        assertThat(PermissibleVoltage.durationAt(PermissibleVoltage.IEC_60831, ratio))
                .isEqualTo(iec);
        assertThat(PermissibleVoltage.durationAt(PermissibleVoltage.IEEE_18, ratio))
                .isEqualTo(ieee);
    }

    @ParameterizedTest
    @CsvSource({"A, 40, 30, 20", "B, 45, 35, 25", "C, 50, 40, 30", "D, 55, 45, 35"})
    void temperatureClasses(TemperatureClass letter, int maximum, int day, int year) {
        // IEC 60831-1; maxima as quoted on a page on capacitor life, means from memory
        assertThat(letter.maximumCelsius()).isEqualTo(maximum);
        assertThat(letter.dayMeanCelsius()).isEqualTo(day);
        assertThat(letter.yearMeanCelsius()).isEqualTo(year);
    }
}
