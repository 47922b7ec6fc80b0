// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.math.BigDecimal;
import java.math.RoundingMode;
import tariff.meter.Apparent;
import tariff.meter.DemandInterval;
import tariff.meter.IntervalRange;
import tariff.meter.IntervalSeries;
import tariff.meter.RunningDemand;

/**
 * Counts the registers after a bank. Everything is in scaled kvar (energy of an interval × intervals per hour), where a bank of
 * so many kvar is a whole number at any step, so that nothing rounds until the end.
 */
final class ReactiveTally {
    private final IntervalSeries series;
    private final RunningDemand demand;
    private long before;
    private long lagging;
    private long leading;
    private long peakKva;
    private long peakSquared;
    private long peakLagging;
    private long peakLeading;

    ReactiveTally(IntervalSeries series, DemandInterval demand) {
        this.series = series;
        this.demand = new RunningDemand(series, demand);
    }

    /** A bank that gives the same in every interval of a range; the sums of {@link #add}, kept in registers of the processor. */
    void addAll(IntervalRange range, long bankKvar) {
        if (demand.steps() > 1) {
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
            if (!Apparent.squaresFit(kw, net)) {
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
            demand.skip();
            return;
        }
        long lag = series.scaledLaggingKvarh(interval) * series.perHour();
        long lead = series.scaledLeadingKvarh(interval) * series.perHour();
        long swing = Math.min(lag, lead);
        long net = lag - lead - bankKvar;
        long newLag = swing + Math.max(0, net);
        long newLead = swing + Math.max(0, -net);
        before += lag;
        lagging += newLag;
        leading += newLead;
        if (demand.add(series.scaledKwh(interval) * series.perHour(), newLag, newLead)) {
            peakLagging = Math.max(peakLagging, demand.lagging());
            peakLeading = Math.max(peakLeading, demand.leading());
            apparent(mean(demand.kwh()), mean(demand.lagging() - demand.leading()));
        }
    }

    /** The average of a demand, half up where a bank that switched inside it leaves no whole number. */
    private long mean(long sum) {
        int steps = demand.steps();
        return steps == 1 ? sum : Math.floorDiv(2 * sum + steps, 2L * steps);
    }

    /** A root is drawn only where the squares are the highest so far. */
    private void apparent(long kw, long kvar) {
        if (Apparent.squaresFit(kw, kvar)) {
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
                over(peakLagging, demand.steps()),
                over(peakLeading, demand.steps()),
                series.decimal(peakKva));
    }

    private BigDecimal energy(long scaledKvarIntervals) {
        return over(scaledKvarIntervals, series.perHour());
    }

    /** Exact where the quotient has two decimals more than the series, else half up there. */
    private BigDecimal over(long scaled, int divisor) {
        return series.decimal(scaled).divide(BigDecimal.valueOf(divisor), series.scale() + 2, RoundingMode.HALF_UP);
    }
}
