// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class PowerTriangleTest {

    @ParameterizedTest(name = "tan phi at {0} is {1}")
    @CsvSource(delimiter = '|', textBlock = """
            # PF  | tan φ  | source
            0.80  | 0.7500 | own arithmetic: 0.6 / 0.8
            0.85  | 0.6197 | own arithmetic: √(1 − 0.85²) / 0.85
            0.90  | 0.4843 | own arithmetic
            0.92  | 0.4260 | own arithmetic
            0.93  | 0.3952 | own arithmetic
            0.95  | 0.3287 | own arithmetic
            0.97  | 0.2506 | own arithmetic
            1.00  | 0.0000 | by thought
            """)
    void tanPhiOfAPowerFactor(double pf, double tanPhi, String source) {
        assertThat(PowerTriangle.tanPhi(pf)).as(source).isCloseTo(tanPhi, within(5e-5));
        assertThat(PowerTriangle.cosPhi(PowerTriangle.tanPhi(pf))).isCloseTo(pf, within(1e-12));
    }

    @ParameterizedTest(name = "{0} to {1}: {2} kvar per kW")
    @CsvSource(delimiter = '|', textBlock = """
            # from | to   | printed | source
            0.50   | 0.80 | 0.982   | Power factor correction: a guide for the plant engineer, Nov 2010, table 6
            0.50   | 0.85 | 1.112   | same
            0.50   | 0.90 | 1.248   | same
            0.50   | 0.95 | 1.403   | same
            0.50   | 0.98 | 1.529   | same
            0.50   | 0.99 | 1.589   | same; subtracts rounded tangents, exact is 1.590
            0.50   | 1.00 | 1.732   | same
            0.60   | 0.85 | 0.713   | same; exact is 0.714
            0.60   | 0.95 | 1.004   | same; exact is 1.005
            """)
    void multiplierTableAsPrinted(double from, double to, double printed, String source) {
        assertThat(PowerTriangle.kvarBetween(1, from, to)).as(source).isCloseTo(printed, within(0.0015));
    }

    @ParameterizedTest(name = "row {0}")
    @CsvSource(delimiter = '|', textBlock = """
            # own arithmetic to three decimals: kvar per kW to reach the power factor at the head of the column
            # from| 0.85  | 0.90  | 0.92  | 0.95  | 0.96  | 0.97  | 0.98  | 0.99  | 1.00
            0.50  | 1.112 | 1.248 | 1.306 | 1.403 | 1.440 | 1.481 | 1.529 | 1.590 | 1.732
            0.55  | 0.899 | 1.034 | 1.092 | 1.190 | 1.227 | 1.268 | 1.315 | 1.376 | 1.518
            0.60  | 0.714 | 0.849 | 0.907 | 1.005 | 1.042 | 1.083 | 1.130 | 1.191 | 1.333
            0.65  | 0.549 | 0.685 | 0.743 | 0.840 | 0.877 | 0.919 | 0.966 | 1.027 | 1.169
            0.70  | 0.400 | 0.536 | 0.594 | 0.692 | 0.729 | 0.770 | 0.817 | 0.878 | 1.020
            0.72  | 0.344 | 0.480 | 0.538 | 0.635 | 0.672 | 0.713 | 0.761 | 0.821 | 0.964
            0.74  | 0.289 | 0.425 | 0.483 | 0.580 | 0.617 | 0.658 | 0.706 | 0.766 | 0.909
            0.75  | 0.262 | 0.398 | 0.456 | 0.553 | 0.590 | 0.631 | 0.679 | 0.739 | 0.882
            0.76  | 0.235 | 0.371 | 0.429 | 0.526 | 0.563 | 0.605 | 0.652 | 0.713 | 0.855
            0.78  | 0.183 | 0.318 | 0.376 | 0.474 | 0.511 | 0.552 | 0.599 | 0.660 | 0.802
            0.80  | 0.130 | 0.266 | 0.324 | 0.421 | 0.458 | 0.499 | 0.547 | 0.608 | 0.750
            0.82  | 0.078 | 0.214 | 0.272 | 0.369 | 0.406 | 0.447 | 0.495 | 0.556 | 0.698
            0.84  | 0.026 | 0.162 | 0.220 | 0.317 | 0.354 | 0.395 | 0.443 | 0.503 | 0.646
            0.85  | 0.000 | 0.135 | 0.194 | 0.291 | 0.328 | 0.369 | 0.417 | 0.477 | 0.620
            0.86  | 0.000 | 0.109 | 0.167 | 0.265 | 0.302 | 0.343 | 0.390 | 0.451 | 0.593
            0.88  | 0.000 | 0.055 | 0.114 | 0.211 | 0.248 | 0.289 | 0.337 | 0.397 | 0.540
            0.90  | 0.000 | 0.000 | 0.058 | 0.156 | 0.193 | 0.234 | 0.281 | 0.342 | 0.484
            0.92  | 0.000 | 0.000 | 0.000 | 0.097 | 0.134 | 0.175 | 0.223 | 0.284 | 0.426
            """)
    void multiplierTableExact(
            double from, double a, double b, double c, double d, double e, double f, double g, double h, double i) {
        double[] targets = {0.85, 0.90, 0.92, 0.95, 0.96, 0.97, 0.98, 0.99, 1.00};
        double[] row = {a, b, c, d, e, f, g, h, i};
        for (int column = 0; column < row.length; column++) {
            double kvar = PowerTriangle.kvarBetween(1, from, targets[column]);
            assertThat(kvar).as("to " + targets[column]).isCloseTo(row[column], within(0.00051));
            double identity = Math.tan(Math.acos(from)) - Math.tan(Math.acos(targets[column]));
            assertThat(kvar).isCloseTo(Math.max(0, identity), within(1e-9));
        }
    }

    @ParameterizedTest(name = "{0} kW from {1} to {2}: {3} kvar")
    @CsvSource(delimiter = '|', textBlock = """
            # kW   | from | to   | kvar    | within | source
            5      | 0.75 | 0.90 | 1.988   | 0.0005 | Mehta & Mehta, Principles of Power System, ch. 6, ex. 6.4, p. 111
            650    | 0.65 | 1.00 | 759.93  | 0.01   | worked example of a maker of meters (759.85 with its rounded factor)
            620    | 0.65 | 0.90 | 424.58  | 0.01   | own arithmetic: 620 × 0.68481
            100    | 0.75 | 0.90 | 39.76   | 0.005  | own arithmetic: 100 × (0.88192 − 0.48432)
            100    | 0.70 | 0.95 | 69.15   | 0.005  | own arithmetic: 100 × (1.02020 − 0.32868)
            423.69 | 0.75 | 0.90 | 168.46  | 0.01   | Gönen, Electric Power Distribution System Engineering, p. 393
            200    | 0.80 | 0.86602540 | 34.53 | 0.005 | Mehta & Mehta ex. 6.16, p. 120
            """)
    void kvarBetweenTwoPowerFactors(double kw, double from, double to, double kvar, double within, String source) {
        assertThat(PowerTriangle.kvarBetween(kw, from, to)).as(source).isCloseTo(kvar, within(within));
    }

    @Test
    void fourHundredTenKvarOnAnIndustrialLoad() {
        // Energy Efficiency Guide for Industry in Asia, chapter on electricity (from memory); arithmetic agrees
        PowerTriangle before = PowerTriangle.lagging(1160 * 0.70, 0.70);
        PowerTriangle after = before.withBank(410);
        assertThat(before.activeKw()).isCloseTo(812, within(1e-9));
        assertThat(before.reactiveKvar()).isCloseTo(828.4, within(0.05));
        assertThat(after.powerFactor()).isCloseTo(0.8889, within(5e-5));
        assertThat(after.apparentKva()).isCloseTo(913.5, within(0.05));
        assertThat(before.apparentKva() / 1500).isCloseTo(0.773, within(5e-4));
        assertThat(after.apparentKva() / 1500).isCloseTo(0.609, within(5e-4));
    }

    @Test
    void aHundredKilowattsAtSeventyAndNinetyFivePerCent() {
        // DOE/GO-10096-286 gives about 142 and 105 kVA and 35 % more current (from memory); exact by own arithmetic:
        // 100 / PF
        PowerTriangle low = PowerTriangle.lagging(100, 0.70);
        PowerTriangle high = PowerTriangle.lagging(100, 0.95);
        assertThat(low.apparentKva()).isCloseTo(142.857, within(5e-4));
        assertThat(high.apparentKva()).isCloseTo(105.263, within(5e-4));
        assertThat(low.lineAmps(400) / high.lineAmps(400)).isCloseTo(1.3571, within(5e-5));
    }

    @Test
    void inductionMotorSynchronousMotorAndLighting() {
        // Mehta & Mehta ex. 6.10, p. 114
        PowerTriangle induction = PowerTriangle.lagging(37.3 / 0.85, 0.8);
        PowerTriangle synchronous = PowerTriangle.lagging(18.65 / 0.9, 0.9);
        PowerTriangle site = new PowerTriangle(
                induction.activeKw() + synchronous.activeKw() + 10,
                induction.reactiveKvar() - synchronous.reactiveKvar());
        assertThat(induction.reactiveKvar()).isCloseTo(32.91, within(0.01));
        assertThat(synchronous.reactiveKvar()).isCloseTo(10.04, within(0.01));
        assertThat(site.activeKw()).isCloseTo(74.60, within(0.01));
        assertThat(site.apparentKva()).isCloseTo(78.03, within(0.01));
        assertThat(site.side()).isEqualTo(PowerTriangle.Side.LAGGING);
    }

    @Test
    void monthOfEnergiesHasTheSameTriangle() {
        // own arithmetic: 3-4-5 triangle
        assertThat(new PowerTriangle(120_000, 90_000).powerFactor()).isEqualTo(0.8);
    }

    @Test
    void unityAndLeadingAreDifferentStates() {
        PowerTriangle load = new PowerTriangle(400, 300);
        assertThat(load.withBank(300).side()).isEqualTo(PowerTriangle.Side.UNITY);
        assertThat(load.withBank(300).powerFactor()).isEqualTo(1);
        assertThat(load.withBank(600).side()).isEqualTo(PowerTriangle.Side.LEADING);
        assertThat(load.withBank(600).powerFactor()).isEqualTo(load.powerFactor());
        assertThat(load.withBank(0)).isEqualTo(load);
    }

    @Test
    void aTargetAlreadyMetNeedsNothing() {
        assertThat(PowerTriangle.kvarBetween(500, 0.95, 0.95)).isZero();
        assertThat(PowerTriangle.kvarBetween(500, 0.97, 0.95)).isZero();
        assertThat(PowerTriangle.kvarBetween(0, 0.5, 0.95)).isZero();
    }

    @Test
    void nothingFlowingCountsAsUnity() {
        assertThat(new PowerTriangle(0, 0).powerFactor()).isEqualTo(1);
        assertThat(new PowerTriangle(0, 50).powerFactor()).isZero();
    }

    @Test
    void theBankThatIsAskedForReachesTheTarget() {
        Random random = new Random(1);
        for (int i = 0; i < 1000; i++) {
            double kw = random.nextDouble(1, 5000);
            double from = random.nextDouble(0.3, 0.99);
            double to = random.nextDouble(from, 1);
            PowerTriangle after = PowerTriangle.lagging(kw, from).withBank(PowerTriangle.kvarBetween(kw, from, to));
            assertThat(after.powerFactor()).isCloseTo(to, within(1e-9));
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, -0.1, 1.0000001, Double.NaN, Double.POSITIVE_INFINITY})
    void powerFactorsOutsideTheirRangeAreRefused(double pf) {
        assertThatThrownBy(() -> PowerTriangle.tanPhi(pf))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("powerFactor was " + pf + "; allowed: above 0, up to 1");
    }

    @Test
    void refusalsNameWhatWasGivenAndWhatIsAllowed() {
        assertThatThrownBy(() -> new PowerTriangle(-3, 0)).hasMessage("activeKw was -3.0; allowed: 0 kW or more");
        assertThatThrownBy(() -> new PowerTriangle(3, Double.NaN))
                .hasMessage("reactiveKvar was NaN; allowed: a number of kvar");
        assertThatThrownBy(() -> new PowerTriangle(3, 0).lineAmps(0))
                .hasMessage("lineVolts was 0.0; allowed: above 0 V");
        assertThatThrownBy(() -> PowerTriangle.kvarBetween(100, 0.8, 95))
                .hasMessage("targetPf was 95.0; allowed: above 0, up to 1");
    }
}
