// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Lagging kvarh that a constant bank leaves, known only from a month's totals. Own derivation, checked by simulated load curves. */
class ReactiveMonthTest {

    // Q kvarh | T h | M kvar | c kvar | least left | most left | source
    @ParameterizedTest
    @CsvSource({
        // 150,000 − 200 × 730 = 4,000; 150,000 × (1 − 200/450) = 83,333.33; own arithmetic
        "150000, 730, 450, 200, 4000, 83333.3333",
        // removed 60,000 to 108,000 of 120,000: own arithmetic on 720 h and a highest 300 kvar
        "120000, 720, 300, 150, 12000, 60000",
        // a bank as large as the highest kvar leaves nothing
        "120000, 720, 300, 300, 0, 0",
        // no bank leaves all
        "120000, 720, 300, 0, 120000, 120000"
    })
    void kvarhLeftLieBetweenAnEvenLoadAndOneThatIsAllPeak(
            String kvarh, String hours, String peak, String bank, double least, double most) {
        ReactiveMonth month = month(kvarh, hours, peak);
        assertThat(month.left(new BigDecimal(bank), Estimate.HIGH).doubleValue())
                .isCloseTo(least, within(1e-3));
        assertThat(month.left(new BigDecimal(bank), Estimate.LOW).doubleValue()).isCloseTo(most, within(1e-3));
    }

    // Q kvarh | T h | M kvar | T' h | least Q' | in proportion | most Q' | source
    @ParameterizedTest
    @CsvSource({
        // 120,000 − 300 × 240 = 48,000; 120,000 × 480 ÷ 720 = 80,000; 300 × 480 is more than all
        "120000, 720, 300, 480, 48000, 80000, 120000",
        // 300 × 480 is more than all; 120,000 × 240 ÷ 720; 300 × 240
        "120000, 720, 300, 240, 0, 40000, 72000",
        // an even load: everything in proportion
        "144000, 720, 200, 180, 36000, 36000, 36000",
        // never off
        "120000, 720, 300, 720, 120000, 120000, 120000"
    })
    void kvarhOfTheHoursThatATimeSwitchLeaves(
            String kvarh, String hours, String peak, String on, String least, String even, String most) {
        ReactiveMonth month = month(kvarh, hours, peak);
        BigDecimal hoursOn = new BigDecimal(on);
        assertThat(month.during(hoursOn, Estimate.LOW).laggingKvarh()).isEqualByComparingTo(least);
        assertThat(month.during(hoursOn, Estimate.CENTRAL).laggingKvarh()).isEqualByComparingTo(even);
        assertThat(month.during(hoursOn, Estimate.HIGH).laggingKvarh()).isEqualByComparingTo(most);
    }

    @Test
    void withoutAnyPeakAllMayHaveFlownWhileTheBankWasOff() {
        ReactiveMonth month =
                new ReactiveMonth(new BigDecimal("120000"), new BigDecimal("720"), Optional.empty(), Optional.empty());
        BigDecimal hoursOn = new BigDecimal("480");
        assertThat(month.during(hoursOn, Estimate.LOW).laggingKvarh()).isZero();
        assertThat(month.during(hoursOn, Estimate.HIGH).laggingKvarh()).isEqualByComparingTo("120000");
    }

    @Test
    void withoutAnyPeakNothingIsPromised() {
        ReactiveMonth month =
                new ReactiveMonth(new BigDecimal("120000"), new BigDecimal("720"), Optional.empty(), Optional.empty());
        assertThat(month.left(new BigDecimal("150"), Estimate.LOW)).isEqualByComparingTo("120000");
    }

    // Q | T | M | c | left under the power curve: quadrature-checked figures of the derivation, own arithmetic
    @ParameterizedTest
    @CsvSource({"150000, 730, 450, 200, 44133.22", "120000, 720, 300, 150, 32181.51"})
    void thePowerCurveAgreesWithItsQuadrature(double kvarh, double hours, double peak, double bank, double left) {
        assertThat(curve(kvarh / hours, peak, hours).powerCurve(bank)).isCloseTo(left, within(0.01));
    }

    /** Removed kvarh = ∫ min(q, c) over the density, by the midpoint rule on 200,000 strips. */
    @ParameterizedTest
    @CsvSource({"205, 450, 730, 200", "30, 300, 720, 50", "260, 300, 720, 150", "150, 300, 744, 10"})
    void theTruncatedExponentialAgreesWithItsQuadrature(double mean, double peak, double hours, double bank) {
        double shape = shapeByBisection(mean / peak);
        double sum = 0;
        double weight = 0;
        int strips = 200_000;
        for (int i = 0; i < strips; i++) {
            double q = peak * (i + 0.5) / strips;
            double density = Math.exp(-shape * q / peak);
            sum += Math.min(q, bank) * density;
            weight += density;
        }
        assertThat(curve(mean, peak, hours).exponentialRemoved(bank)).isCloseTo(hours * sum / weight, within(0.05));
    }

    private static LoadCurve curve(double mean, double peak, double hours) {
        return LoadCurve.of(BigDecimal.valueOf(mean * hours), BigDecimal.valueOf(hours), BigDecimal.valueOf(peak));
    }

    private static double shapeByBisection(double share) {
        double low = -400;
        double high = 400;
        for (int i = 0; i < 200; i++) {
            double middle = (low + high) / 2;
            double mean = Math.abs(middle) < 1e-9 ? 0.5 : 1 / middle - 1 / Math.expm1(middle);
            if (mean > share) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return (low + high) / 2;
    }

    @Test
    void everySimulatedLoadLiesWithinTheBounds() {
        Random random = new Random(20260101);
        for (int i = 0; i < 3_000; i++) {
            double[] kvar = profile(random);
            double bank = random.nextDouble() * 500;
            double total = 0;
            double left = 0;
            double peak = 0;
            for (double q : kvar) {
                total += q;
                left += Math.max(0, q - bank);
                peak = Math.max(peak, q);
            }
            ReactiveMonth month = new ReactiveMonth(
                    BigDecimal.valueOf(total),
                    BigDecimal.valueOf(kvar.length),
                    Optional.of(BigDecimal.valueOf(peak)),
                    Optional.of(BigDecimal.valueOf(peak)));
            BigDecimal c = BigDecimal.valueOf(bank);
            assertThat(left)
                    .isGreaterThanOrEqualTo(month.left(c, Estimate.HIGH).doubleValue() - 1e-6)
                    .isLessThanOrEqualTo(month.left(c, Estimate.LOW).doubleValue() + 1e-6);
            assertThat(month.left(c, Estimate.CENTRAL))
                    .isBetween(month.left(c, Estimate.HIGH), month.left(c, Estimate.LOW));
        }
    }

    private static double[] profile(Random random) {
        double[] kvar = new double[1 + random.nextInt(60)];
        double exponent = Math.exp(random.nextGaussian());
        for (int i = 0; i < kvar.length; i++) {
            kvar[i] = random.nextInt(5) == 0 ? 0 : 450 * Math.pow(random.nextDouble(), exponent);
        }
        return kvar;
    }

    private static ReactiveMonth month(String kvarh, String hours, String peak) {
        Optional<BigDecimal> highest = Optional.of(new BigDecimal(peak));
        return new ReactiveMonth(new BigDecimal(kvarh), new BigDecimal(hours), highest, highest);
    }
}
