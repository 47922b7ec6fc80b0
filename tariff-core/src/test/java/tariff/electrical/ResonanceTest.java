// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ResonanceTest {

    @ParameterizedTest(name = "{0} kVA, {1} %, {2} kvar: {3}")
    @CsvSource(delimiter = '|', textBlock = """
            # kVA | Z %  | kvar | h_r   | source
            1500  | 6    | 500  | 7.071 | own arithmetic: √(25000/500)
            1000  | 6    | 250  | 8.165 | own arithmetic: √(16667/250)
            630   | 4    | 200  | 8.874 | own arithmetic: √(15750/200)
            1000  | 4    | 50   | 22.36 | own arithmetic: √(100 / (4 × 0.05))
            1000  | 5    | 200  | 10.00 | own arithmetic: √(100 / (5 × 0.2))
            1000  | 5.75 | 300  | 7.61  | own arithmetic: √(100 / (5.75 × 0.3))
            1000  | 6    | 100  | 12.91 | own arithmetic: √(100 / (6 × 0.1))
            1000  | 6    | 500  | 5.77  | own arithmetic: √(100 / (6 × 0.5))
            """)
    void resonanceBehindATransformer(double kva, double z, double kvar, double order, String source) {
        assertThat(Resonance.order(ShortCircuit.behindTransformerKva(kva, z), kvar))
                .as(source)
                .isCloseTo(order, within(0.006));
    }

    @Test
    void theNetworkLowersTheResonance() {
        // own arithmetic: 1/(0.06/1000 + 1/250000) = 15 625 kVA, √(15625/250)
        assertThat(Resonance.order(ShortCircuit.behindTransformerKva(1000, 6, 250_000), 250))
                .isCloseTo(7.906, within(5e-4));
    }

    @ParameterizedTest(name = "{0} V, {1} kA: {2} kVA")
    @CsvSource({"480, 35, 29098", "400, 25, 17321"})
    void shortCircuitPowerFromAFaultCurrent(double volts, double kiloamps, double kva) {
        // own arithmetic: √3 × U × I
        assertThat(ShortCircuit.fromFaultKva(volts, kiloamps)).isCloseTo(kva, within(0.6));
    }

    @ParameterizedTest(name = "order {0}: {1} kvar")
    @CsvSource({"3, 1851.9", "5, 666.7", "7, 340.1", "11, 137.7", "13, 98.6"})
    void kvarThatTunesToAnOrder(int order, double kvar) {
        // own arithmetic: 1000 kVA at 6 % is 16 667 kVA, over h²
        double sc = ShortCircuit.behindTransformerKva(1000, 6);
        assertThat(Resonance.kvarTunedTo(order, sc)).isCloseTo(kvar, within(0.06));
        assertThat(Resonance.order(sc, Resonance.kvarTunedTo(order, sc))).isCloseTo(order, within(1e-9));
    }

    @ParameterizedTest(name = "h_r 7.049, h {0}: network {1}, bank {2}")
    @CsvSource({"5, 2.01, 1.01", "11, 0.70, 1.70", "13, 0.42, 1.42"})
    void amplification(int order, double network, double bank) {
        // own arithmetic: h_r²/|h_r² − h²| and h²/|h_r² − h²| at h_r² = 49.69
        assertThat(Resonance.networkAmplification(49.69, 1, 0, order)).isCloseTo(network, within(0.006));
        assertThat(Resonance.bankAmplification(49.69, 1, 0, order)).isCloseTo(bank, within(0.006));
    }

    @Test
    void atResonanceNothingButDampingLimitsTheCurrent() {
        assertThat(Resonance.networkAmplification(49.69, 1, 0, 7)).isGreaterThan(70);
        assertThat(Resonance.networkAmplification(49, 1, 0, 7)).isGreaterThan(1e12);
    }

    @ParameterizedTest(name = "{0} around {1}: {2} to {3}")
    @CsvSource(delimiter = '|', textBlock = """
            # own arithmetic: h √(k/(k+1)) to h √(k/(k−1)), k 5 and 3
            DANGER  | 3  | 2.74  | 3.35
            DANGER  | 5  | 4.56  | 5.59
            DANGER  | 7  | 6.39  | 7.83
            DANGER  | 11 | 10.04 | 12.30
            DANGER  | 13 | 11.87 | 14.53
            CAUTION | 5  | 4.33  | 6.12
            CAUTION | 7  | 6.06  | 8.57
            CAUTION | 11 | 9.53  | 13.47
            CAUTION | 13 | 11.26 | 15.92
            """)
    void bandsAroundAHarmonic(ResonanceBand band, int order, double low, double high) {
        assertThat(order * band.lowestRatio()).isCloseTo(low, within(0.006));
        assertThat(order * band.highestRatio()).isCloseTo(high, within(0.006));
    }

    @Test
    void amplificationAndRatioDrawTheSameBand() {
        Random random = new Random(2);
        for (int i = 0; i < 2000; i++) {
            double ratio = random.nextDouble(0.5, 2);
            double lift = Resonance.networkAmplification(25 * ratio * ratio, 1, 0, 5);
            for (ResonanceBand band : List.of(ResonanceBand.CAUTION, ResonanceBand.DANGER)) {
                assertThat(lift >= band.factor())
                        .as(band + " at " + ratio)
                        .isEqualTo(ratio >= band.lowestRatio() && ratio <= band.highestRatio());
            }
        }
    }

    @Test
    void networkAndBankShareWhatTheLoadsInject() {
        // own arithmetic: below resonance the two differ by the one ampere injected
        Random random = new Random(3);
        for (int i = 0; i < 500; i++) {
            double sc = random.nextDouble(500, 50_000);
            double kvar = random.nextDouble(10, 400);
            double network = Resonance.networkAmplification(sc, kvar, 0, 5);
            double bank = Resonance.bankAmplification(sc, kvar, 0, 5);
            assertThat(Math.abs(network - bank)).isCloseTo(1, within(1e-6 * network));
        }
    }

    @Test
    void aReactorMovesTheResonanceBelowItsTuning() {
        // own arithmetic: 1/√(0.07 + 300/16667) = 3.371
        double order = Resonance.order(16_667, 300, 0.07);
        assertThat(order).isCloseTo(3.371, within(5e-4)).isLessThan(Detuning.order(0.07));
        assertThat(Resonance.networkAmplification(16_667, 300, 0.07, 5)).isLessThan(1);
    }

    @Test
    void everyDistinctTotalOfTheStepsOnce() {
        assertThat(StepCombinations.totalsKvar(List.of(25.0, 25.0, 50.0))).containsExactly(25.0, 50.0, 75.0, 100.0);
        assertThat(StepCombinations.totalsKvar(List.of(6.25, 12.5, 12.5)))
                .containsExactly(6.25, 12.5, 18.75, 25.0, 31.25);
        assertThat(StepCombinations.totalsKvar(List.of())).isEmpty();
        List<Double> uneven = new Random(6).doubles(24, 1e3, 1e6).boxed().toList();
        assertThat(StepCombinations.totalsKvar(uneven)).hasSizeBetween(1_000, 100_050);
        assertThat(StepCombinations.totalsKvar(List.of(0.001))).containsExactly(0.01);
        assertThatThrownBy(() -> StepCombinations.totalsKvar(List.of(25.0, 0.0)))
                .hasMessage("stepsKvar was 0.0; allowed: above 0 kvar");
    }

    @Test
    void aCombinationIsHeldAgainstTheWorstCapacitanceAllowed() {
        // own arithmetic: 666.67 kvar tunes 16 667 kVA to the 5th; 620 kvar does so at +7.5 % capacitance
        ResonancePoint point = ResonancePoint.of(
                16_666.67, 620, 0, CapacitanceTolerance.IEC_60831_2014_UP_TO_100_KVAR, Set.of(5, 7, 11, 13));
        assertThat(point.order()).isCloseTo(5.185, within(5e-4));
        assertThat(point.harmonic()).isEqualTo(5);
        assertThat(point.amplification()).isInfinite();
        assertThat(point.band()).isEqualTo(ResonanceBand.DANGER);
    }

    @Test
    void someCombinationIsWorseThanTheWholeBank() {
        // own arithmetic: 1000 kVA at 6 %; 140 kvar sits on the 11th, 190 kvar (h_r 9.37) between 7th and 11th
        List<ResonancePoint> points = ResonancePoint.over(
                StepCombinations.totalsKvar(List.of(140.0, 50.0)),
                16_666.67,
                0,
                CapacitanceTolerance.IEEE_18_2012,
                Set.of(5, 7, 11, 13));
        assertThat(points).extracting(ResonancePoint::capacitorKvar).containsExactly(50.0, 140.0, 190.0);
        assertThat(points)
                .extracting(ResonancePoint::band)
                .containsExactly(ResonanceBand.LOW, ResonanceBand.DANGER, ResonanceBand.LOW);
    }

    @Test
    void refusals() {
        assertThatThrownBy(() -> Resonance.order(0, 100)).hasMessage("shortCircuitKva was 0.0; allowed: above 0 kVA");
        assertThatThrownBy(() -> Resonance.order(1000, -1)).hasMessage("capacitorKvar was -1.0; allowed: above 0 kvar");
        assertThatThrownBy(() -> Resonance.kvarTunedTo(1, 1000))
                .hasMessage("order was 1; allowed: a whole number from 2");
        assertThatThrownBy(() -> ShortCircuit.behindTransformerKva(1000, 0))
                .hasMessage("impedancePercent was 0.0; allowed: above 0, up to 100 %");
    }
}
