// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class LossesAndCapacityTest {

    @ParameterizedTest(name = "{0} kvar on {1} kVA, {2} %: {3} %")
    @CsvSource(delimiter = '|', textBlock = """
            # kvar | kVA  | Z %  | rise  | source
            300    | 1000 | 6    | 1.800 | own arithmetic: 300 × 6 / 1000
            400    | 1500 | 5.75 | 1.533 | own arithmetic: 400 × 5.75 / 1500
            200    | 630  | 4    | 1.270 | own arithmetic: 200 × 4 / 630
            0      | 630  | 4    | 0.000 | by thought: no bank, no rise
            """)
    void voltageRise(double kvar, double kva, double z, double percent, String source) {
        assertThat(VoltageRise.percent(kvar, ShortCircuit.behindTransformerKva(kva, z)))
                .as(source)
                .isCloseTo(percent, within(5e-4));
    }

    @Test
    void voltageRiseFromAShortCircuitLevel() {
        // own arithmetic: 35000 / 17391
        assertThat(VoltageRise.percent(350, 17_391)).isCloseTo(2.01, within(0.005));
    }

    @ParameterizedTest(name = "100 kW from {0} to {1}: {2} kVA")
    @CsvSource({
        "0.70, 0.95, 37.59",
        "0.75, 0.95, 28.07",
        "0.80, 0.95, 19.74",
        "0.85, 0.95, 12.38",
        "0.60, 0.90, 55.56",
        "0.90, 0.98, 9.07",
        "0.90, 0.90, 0"
    })
    void kvaReleased(double from, double to, double kva) {
        // own arithmetic: 100 (1/PF1 − 1/PF2)
        assertThat(ReleasedCapacity.kva(100, from, to)).isCloseTo(kva, within(0.006));
    }

    @Test
    void extraLoadThatFits() {
        // own arithmetic; the form of IEEE Std 141 (from memory): 300 × 0.6 + √(1000² − 240²)
        double fits = ReleasedCapacity.loadThatFitsKva(1000, 0.8, 300);
        assertThat(fits).isCloseTo(1150.77, within(0.005));
        assertThat(PowerTriangle.lagging(fits * 0.8, 0.8).withBank(300).apparentKva())
                .isCloseTo(1000, within(1e-9));
        assertThat(ReleasedCapacity.loadThatFitsKva(1000, 0.8, 0)).isEqualTo(1000);
        assertThatThrownBy(() -> ReleasedCapacity.loadThatFitsKva(1000, 0.8, 1001))
                .hasMessage("bankKvar was 1001.0; allowed: 0 kvar up to presentKva");
    }

    @ParameterizedTest(name = "{0} to {1}: {2} %")
    @CsvSource(delimiter = '|', textBlock = """
            # from | to   | cut   | source
            0.78   | 0.98 | 36.65 | worked problem, myElectrical
            0.70   | 0.95 | 45.71 | own arithmetic: 100 (1 − (0.70/0.95)²)
            0.75   | 0.95 | 37.67 | own arithmetic
            0.80   | 0.95 | 29.09 | own arithmetic
            0.85   | 0.95 | 19.94 | own arithmetic
            0.60   | 0.90 | 55.56 | own arithmetic
            0.90   | 0.98 | 15.66 | own arithmetic
            0.90   | 0.90 | 0.00  | by thought
            """)
    void seriesLossCut(double from, double to, double percent, String source) {
        assertThat(SeriesLosses.cutPercent(from, to)).as(source).isCloseTo(percent, within(0.006));
    }

    @Test
    void transformerLossAtTwoPowerFactors() {
        // own arithmetic: 700 kW on 1000 kVA, Pk 7.6 kW: 7.60 kW at 0.70, 4.126 kW at 0.95
        double rho = SeriesLosses.perKva2(7.6, 1000);
        assertThat(rho * Math.pow(700 / 0.70, 2)).isCloseTo(7.60, within(1e-9));
        assertThat(rho * Math.pow(700 / 0.95, 2)).isCloseTo(4.126, within(5e-4));
    }

    @ParameterizedTest(name = "{0} W/kvar: net {1} kWh")
    @CsvSource({"0.5, 161.1", "6, -641.9"})
    void aBankCanBurnMoreThanItSaves(double wattsPerKvar, double net) {
        // own arithmetic: 7.6e-6 (2 × 200 × 150000 − 200² × 730) = 234.1 kWh, less w × 200 × 730 / 1000
        double saved = SeriesLosses.savedKwh(SeriesLosses.perKva2(7.6, 1000), 200, 150_000, 730);
        assertThat(saved).isCloseTo(234.1, within(0.05));
        assertThat(saved - SeriesLosses.ownKwh(wattsPerKvar, 200, 730)).isCloseTo(net, within(0.05));
    }

    @Test
    void savedEnergyNeedsNoLoadProfile() {
        Random random = new Random(4);
        for (int run = 0; run < 50; run++) {
            double bank = random.nextDouble(0, 300);
            double net = 0;
            double before = 0;
            double after = 0;
            for (int hour = 0; hour < 730; hour++) {
                double q = random.nextDouble(-50, 400);
                net += q;
                before += q * q;
                after += (q - bank) * (q - bank);
            }
            assertThat(SeriesLosses.savedKwh(1e-5, bank, net, 730)).isCloseTo(1e-5 * (before - after), within(1e-6));
        }
    }

    @Test
    void noBankSavesNothingAndTwiceTheMeanSavesNothing() {
        assertThat(SeriesLosses.savedKwh(1e-5, 0, 150_000, 730)).isZero();
        double mean = 150_000.0 / 730;
        assertThat(SeriesLosses.savedKwh(1e-5, 2 * mean, 150_000, 730)).isCloseTo(0, within(1e-6));
        assertThat(SeriesLosses.savedKwh(1e-5, 2 * mean + 1, 150_000, 730)).isNegative();
        assertThat(SeriesLosses.savedKwh(1e-5, mean, 150_000, 730)).isCloseTo(1e-5 * 150_000 * mean, within(1e-6));
    }

    @ParameterizedTest(name = "{0} W/kvar, 300 kvar, a year: {1} kWh")
    @CsvSource({"0.2, 525.6", "0.5, 1314", "6, 15768"})
    void ownConsumption(double watts, double kwh) {
        // own arithmetic: w × 300 × 8760 / 1000
        assertThat(SeriesLosses.ownKwh(watts, 300, 8760)).isCloseTo(kwh, within(0.05));
    }

    @ParameterizedTest(name = "loss {0} %, {1} to 0.95: {2} % of kWh")
    @CsvSource({
        "2, 0.70, 0.91",
        "2, 0.80, 0.58",
        "2, 0.85, 0.40",
        "3, 0.70, 1.37",
        "3, 0.80, 0.87",
        "3, 0.85, 0.60",
        "5.9, 0.70, 2.70",
        "5.9, 0.80, 1.72",
        "5.9, 0.85, 1.18",
        "0, 0.70, 0"
    })
    void credibleShareOfKwh(double loss, double from, double percent) {
        // own arithmetic; 5.9 % is the most of IEEE Std 3001.5-2013 table 1: cable 4.0, transformer 1.9
        assertThat(KwhShare.savedPercent(loss, from, 0.95)).isCloseTo(percent, within(0.006));
    }

    @Test
    void atTheMeterThereIsNothingToSave() {
        assertThat(KwhShare.savedPercent(KwhShare.Place.AT_THE_METER.lossPercent(), 0.6, 0.99))
                .isZero();
        assertThat(KwhShare.savedPercent(KwhShare.Place.AT_THE_LOAD.lossPercent(), 0.6, 1))
                .isLessThan(KwhShare.INCREDIBLE_PERCENT);
        assertThatThrownBy(() -> KwhShare.savedPercent(-1, 0.8, 0.9))
                .hasMessage("lossPercent was -1.0; allowed: 0 to 100 %");
    }

    @Test
    void kvarOfATransformer() {
        // Electrical Installation Guide, chapter L: magnetising about 1.8 %; 630 kVA at 4 %, own arithmetic 6.3 × (1.8
        // + 4 k²)
        assertThat(TransformerReactive.kvar(630, 1.8, 4, 0)).isCloseTo(11.34, within(1e-9));
        assertThat(TransformerReactive.kvar(630, 1.8, 4, 1)).isCloseTo(36.54, within(1e-9));
    }

    @ParameterizedTest(name = "load factor {0}, weight {1}: {2}")
    @CsvSource({
        "0.3, 0.15, 0.1215", "0.3, 0.20, 0.1320", "0.3, 0.30, 0.1530", "0.5, 0.15, 0.2875", "0.5, 0.20, 0.3000",
        "0.5, 0.30, 0.3250", "0.65, 0.15, 0.4566", "0.65, 0.20, 0.4680", "0.65, 0.30, 0.4907", "0.7, 0.15, 0.5215",
        "0.7, 0.20, 0.5320", "0.7, 0.30, 0.5530", "0, 0.3, 0", "1, 0.3, 1"
    })
    void lossFactor(double loadFactor, double weight, double expected) {
        // own arithmetic k LF + (1 − k) LF²; 0.65 with 0.3 is printed as .490 in an article on load-loss factors
        assertThat(LossFactor.of(loadFactor, weight))
                .isCloseTo(expected, within(6e-5))
                .isBetween(loadFactor * loadFactor, loadFactor);
    }
}
