// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.Arrays;
import java.util.BitSet;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import tariff.meter.DemandInterval;
import tariff.meter.IntervalSeries;

/** Own arithmetic and own simulation; the load of the arithmetic lies evenly between nothing and its highest. */
class SteppingTest {
    private static final double HOURS = 720;
    private static final double PEAK = 300;

    /** L(x) = T (M − x)² ÷ 2M. */
    private static final DoubleUnaryOperator EVEN = x -> x >= PEAK ? 0 : HOURS * (PEAK - x) * (PEAK - x) / (2 * PEAK);

    /**
     * One step as large as the load: it comes in at θ, evenly from M/3 to 2M/3; left T θ² ÷ 2M, sent back T (M − θ)² ÷ 2M, and the mean of
     * θ² is 7/27 M²: 7/54 × 720 × 300 = 28,000 kvarh either way.
     */
    @Test
    void oneStepAsLargeAsTheLoadLeavesAndSendsBackSevenFiftyFourths() {
        Stepping one = Stepping.of(EVEN, PEAK, PEAK);
        assertThat(one.unsupplied()).isCloseTo(28_000, within(1e-6));
        assertThat(one.oversupplied()).isCloseTo(28_000, within(1e-6));
    }

    @ParameterizedTest
    @CsvSource({"2, 14000", "3, 9333.333", "12, 2333.333", "24, 1166.667", "300, 93.333"})
    void stepsTimesAsFineLeaveSoMuchLess(int steps, double kvarh) {
        Stepping fine = Stepping.of(EVEN, PEAK, PEAK / steps);
        assertThat(fine.unsupplied()).isCloseTo(kvarh, within(0.001));
        assertThat(fine.oversupplied()).isCloseTo(kvarh, within(0.001));
    }

    /** Above the steps all stays: L(150) = 720 × 150² ÷ 600 = 27,000, besides 7/54 × 720 × 150 ÷ 2 = 7,000 for the half of the time below. */
    @Test
    void whatIsAboveTheStepsStays() {
        assertThat(Stepping.of(EVEN, 150, 150).unsupplied()).isCloseTo(34_000, within(1e-6));
        assertThat(Stepping.of(EVEN, 150, 150).oversupplied()).isCloseTo(7_000, within(1e-6));
    }

    /** Steps of 30 kvar, an excess evenly from 0 to 20: of an aim of 10, (1 − 10 ÷ 20)² = a quarter is still sent back; of 20, nothing. */
    @ParameterizedTest
    @CsvSource({"0, 1", "10, 0.25", "20, 0", "500, 0"})
    void aLaggingAimTakesUpTheExcess(double aimKvar, double share) {
        Stepping steps = new Stepping(0, 1_000);
        assertThat(steps.sentBack(aimKvar, 30)).isCloseTo(1_000 * share, within(1e-9));
    }

    /** A load that climbs and falls evenly, minute steps of a kvar, through the controller itself: within a tenth. */
    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 5, 8})
    void aLoadThatWandersThroughARealControllerIsMetWithinATenth(int steps) {
        int size = 12_000;
        long[] kvarh = new long[size];
        for (int i = 0; i < size; i++) {
            int phase = i % 600;
            kvarh[i] = 250L * (phase < 300 ? phase : 600 - phase);
        }
        IntervalSeries series = new IntervalSeries(
                Instant.EPOCH,
                15,
                ZoneOffset.UTC,
                3,
                new long[size],
                kvarh,
                new long[size],
                Optional.empty(),
                new BitSet());
        String[] kvar = new String[steps];
        Arrays.fill(kvar, String.valueOf(240.0 / steps));
        ReactiveOutcome truth = SteppedWalk.of(
                        series,
                        series.all(),
                        DemandInterval.block(15),
                        SteppedBank.of(SteppedBank.Target.kvar(BigDecimal.ZERO), kvar))
                .outcome();
        DoubleUnaryOperator left = x -> x >= PEAK ? 0 : size / 4.0 * (PEAK - x) * (PEAK - x) / (2 * PEAK);
        Stepping ours = Stepping.of(left, 240, 240.0 / steps);
        double kept = truth.laggingKvarh().doubleValue();
        double back = truth.leadingKvarh().doubleValue();
        assertThat(ours.unsupplied()).isCloseTo(kept, within(0.1 * kept));
        assertThat(ours.oversupplied()).isCloseTo(back, within(0.1 * back));
    }
}
