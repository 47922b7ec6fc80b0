// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import tariff.meter.IntervalSeries;

/** Builds the series behind a bank, interval by interval. */
final class Correction {
    private final IntervalSeries series;
    private final long[] lagging;
    private final long[] leading;

    Correction(IntervalSeries series) {
        this.series = series;
        this.lagging = new long[series.size()];
        this.leading = new long[series.size()];
    }

    void set(int interval, long bankKvarh) {
        long lag = series.scaledLaggingKvarh(interval);
        long lead = series.scaledLeadingKvarh(interval);
        long swing = Math.min(lag, lead);
        long net = lag - lead - bankKvarh;
        lagging[interval] = swing + Math.max(0, net);
        leading[interval] = swing + Math.max(0, -net);
    }

    IntervalSeries series() {
        return series.withReactive(lagging, leading);
    }
}
