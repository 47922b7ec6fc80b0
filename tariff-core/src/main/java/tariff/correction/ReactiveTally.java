// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.math.BigDecimal;
import java.math.RoundingMode;
import tariff.meter.Apparent;
import tariff.meter.DemandInterval;
import tariff.meter.IntervalRange;
import tariff.meter.IntervalSeries;

/**
 * Counts the registers after a bank. Everything is in scaled kvar (energy of an interval × intervals per hour), where a bank of
 * so many kvar is a whole number at any step, so that nothing rounds until the end.
 */
final class ReactiveTally {
    /** Below this the squares of two numbers add up within a long. */
    private static final long SQUARES_FIT = 1L << 31;

    private final IntervalSeries series;
    private final int steps;
    private long before;
    private long lagging;
    private long leading;
    private long blockKw;
    private long blockLagging;
    private long blockLeading;
    private int inBlock;
    private boolean wholeBlock = true;
    private long peakKva;
    private long peakSquared;
    private long peakLagging;
    private long peakLeading;

    ReactiveTally(IntervalSeries series, DemandInterval demand) {
        if (demand.sliding()) {
            throw new IllegalArgumentException("a bank is walked through demand blocks, not sliding ones");
        }
        this.series = series;
        this.steps = demand.stepsIn(series);
    }

    /** A bank that gives the same in every interval of a range; the sums of {@link #add}, kept in registers of the processor. */
    void addAll(IntervalRange range, long bankKvar) {
        if (steps > 1) {
            for (int i = range.from(); i < range.to(); i++) {
                add(i, bankKvar);
            }
            return;
        }
        for (int from = range.from(); from < range.to(); ) {
            int absent = Math.min(series.nextAbsent(from), range.to());
            addRecorded(from, absent, bankKvar);
            from = absent + 1;
        }
    }

    private void addRecorded(int from, int to, long bankKvar) {
        long perHour = series.perHour();
        long sumBefore = 0;
        long sumLagging = 0;
        long sumLeading = 0;
        long mostLagging = peakLagging;
        long mostLeading = peakLeading;
        long mostSquared = peakSquared;
        for (int i = from; i < to; i++) {
            long lag = series.scaledLaggingKvarh(i) * perHour;
            long lead = series.scaledLeadingKvarh(i) * perHour;
            long swing = Math.min(lag, lead);
            long net = lag - lead - bankKvar;
            long newLag = swing + Math.max(0, net);
            long newLead = swing + Math.max(0, -net);
            sumBefore += lag;
            sumLagging += newLag;
            sumLeading += newLead;
            mostLagging = Math.max(mostLagging, newLag);
            mostLeading = Math.max(mostLeading, newLead);
            long kw = series.scaledKwh(i) * perHour;
            if (kw >= SQUARES_FIT || net >= SQUARES_FIT || net <= -SQUARES_FIT) {
                peakKva = Math.max(peakKva, Apparent.of(kw, net));
            } else if (kw * kw + net * net > mostSquared) {
                mostSquared = kw * kw + net * net;
                peakKva = Math.max(peakKva, Apparent.of(kw, net));
            }
        }
        peakSquared = mostSquared;
        before += sumBefore;
        lagging += sumLagging;
        leading += sumLeading;
        peakLagging = mostLagging;
        peakLeading = mostLeading;
    }

    /** What both registers of one interval counted stays: within the interval the load swung from one side to the other. */
    void add(int interval, long bankKvar) {
        if (series.isAbsent(interval)) {
            wholeBlock = false;
        } else {
            long lag = series.scaledLaggingKvarh(interval) * series.perHour();
            long lead = series.scaledLeadingKvarh(interval) * series.perHour();
            long swing = Math.min(lag, lead);
            long net = lag - lead - bankKvar;
            long newLag = swing + Math.max(0, net);
            long newLead = swing + Math.max(0, -net);
            before += lag;
            lagging += newLag;
            leading += newLead;
            blockKw += series.scaledKwh(interval) * series.perHour();
            blockLagging += newLag;
            blockLeading += newLead;
        }
        if (++inBlock == steps) {
            endBlock();
        }
    }

    private void endBlock() {
        if (wholeBlock) {
            peakLagging = Math.max(peakLagging, blockLagging);
            peakLeading = Math.max(peakLeading, blockLeading);
            apparent(blockKw, blockLagging - blockLeading);
        }
        blockKw = 0;
        blockLagging = 0;
        blockLeading = 0;
        inBlock = 0;
        wholeBlock = true;
    }

    /** A root is drawn only where the squares are the highest so far. */
    private void apparent(long kw, long kvar) {
        if (kw < SQUARES_FIT && Math.abs(kvar) < SQUARES_FIT) {
            long squared = kw * kw + kvar * kvar;
            if (squared <= peakSquared) {
                return;
            }
            peakSquared = squared;
        }
        peakKva = Math.max(peakKva, Apparent.of(kw, kvar));
    }

    ReactiveOutcome outcome() {
        return new ReactiveOutcome(
                energy(lagging),
                energy(leading),
                energy(before - lagging),
                over(peakLagging, steps),
                over(peakLeading, steps),
                over(peakKva, steps));
    }

    private BigDecimal energy(long scaledKvarIntervals) {
        return over(scaledKvarIntervals, series.perHour());
    }

    /** Exact where the quotient has two decimals more than the series, else half up there. */
    private BigDecimal over(long scaled, int divisor) {
        return series.decimal(scaled).divide(BigDecimal.valueOf(divisor), series.scale() + 2, RoundingMode.HALF_UP);
    }
}
