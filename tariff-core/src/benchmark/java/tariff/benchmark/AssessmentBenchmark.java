// SPDX-License-Identifier: Apache-2.0
package tariff.benchmark;

import java.math.BigDecimal;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import tariff.bill.Billing;
import tariff.correction.CapacitorBank;
import tariff.correction.Estimate;
import tariff.json.RateFile;
import tariff.meter.MeteredMonth;
import tariff.proposal.Assessment;
import tariff.proposal.Proposal;

/** How much does it cost that a rate is data? An assessment of twelve months against the same arithmetic coded by hand. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 4, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(2)
public class AssessmentBenchmark {
    private final List<MeteredMonth> year = SixLineRate.year();
    private final Billing billing = new Billing(RateFile.parse(SixLineRate.JSON), SixLineRate.site());
    private final Proposal proposal = Proposal.of(CapacitorBank.fixed(SixLineRate.BANK_KVAR));

    /** Both must give the same money, or the comparison says nothing. */
    @Setup
    public void agree() {
        Assessment assessment = rateAsData();
        BigDecimal[] byHand = byHand();
        BigDecimal billed = assessment.today().billed();
        check(byHand[0], billed);
        check(byHand[1], billed.subtract(assessment.today().penalty()));
        check(byHand[2], billed.subtract(assessment.today().toUnity()));
        check(byHand[3], assessment.savings(Estimate.LOW).settledYearTotal());
        check(byHand[4], assessment.savings(Estimate.CENTRAL).settledYearTotal());
        check(byHand[5], assessment.savings(Estimate.HIGH).settledYearTotal());
    }

    @Benchmark
    public Assessment rateAsData() {
        return Assessment.of(billing, year, proposal);
    }

    @Benchmark
    public BigDecimal[] byHand() {
        return ByHand.assess(year, SixLineRate.BANK_KVAR);
    }

    private static void check(BigDecimal byHand, BigDecimal asData) {
        if (byHand.compareTo(asData) != 0) {
            throw new IllegalStateException("by hand " + byHand + ", as data " + asData);
        }
    }
}
