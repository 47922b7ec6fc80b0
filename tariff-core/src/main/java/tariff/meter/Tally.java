// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.math.BigDecimal;
import java.util.EnumMap;
import java.util.Map;

/** Counts the registers of a stretch of intervals, in scaled whole numbers. */
final class Tally {
    private final IntervalSeries series;
    private final int perHour;
    private int intervals;
    private int present;
    private long kwh;
    private long laggingKvarh;
    private long leadingKvarh;
    private long exportedKwh;
    private long apparentKvah;
    private boolean anyDemand;
    private long peakKw;
    private long peakKva;
    private long peakLaggingKvar;
    private long peakLeadingKvar;

    private Tally(IntervalSeries series, int perHour) {
        this.series = series;
        this.perHour = perHour;
    }

    /** @param window the bit of the window to count in, 0 for all */
    static Readings readings(MonthlySums sums, IntervalRange range, long window) {
        Tally tally = new Tally(sums.series(), sums.demand().perHour());
        for (int i = range.from(); i < range.to(); i++) {
            if ((sums.calendar().mask(i) & window) == window) {
                tally.count(i);
            }
        }
        new Demands(sums.series(), sums.calendar(), sums.demand()).walk(range, window, tally::demand);
        return tally.readings();
    }

    private void count(int i) {
        intervals++;
        if (series.isAbsent(i)) {
            return;
        }
        present++;
        long active = series.scaledKwh(i);
        long lagging = series.scaledLaggingKvarh(i);
        long leading = series.scaledLeadingKvarh(i);
        kwh += active;
        laggingKvarh += lagging;
        leadingKvarh += leading;
        exportedKwh += series.scaledExportedKwh(i);
        apparentKvah += Apparent.of(active, lagging - leading);
    }

    private void demand(int start, long active, long lagging, long leading) {
        anyDemand = true;
        peakKw = Math.max(peakKw, active * perHour);
        peakKva = Math.max(peakKva, Apparent.of(active * perHour, (lagging - leading) * perHour));
        peakLaggingKvar = Math.max(peakLaggingKvar, lagging * perHour);
        peakLeadingKvar = Math.max(peakLeadingKvar, leading * perHour);
    }

    private Readings readings() {
        if (intervals > 0 && present == 0) {
            return Readings.none();
        }
        Map<Register, BigDecimal> values = new EnumMap<>(Register.class);
        values.put(Register.ENERGY_KWH, series.decimal(kwh));
        values.put(Register.LAGGING_KVARH, series.decimal(laggingKvarh));
        values.put(Register.LEADING_KVARH, series.decimal(leadingKvarh));
        values.put(Register.APPARENT_KVAH, series.decimal(apparentKvah));
        if (series.hasExport()) {
            values.put(Register.EXPORTED_KWH, series.decimal(exportedKwh));
        }
        if (anyDemand || intervals == 0) {
            values.put(Register.PEAK_KW, series.decimal(peakKw));
            values.put(Register.PEAK_KVA, series.decimal(peakKva));
            values.put(Register.PEAK_LAGGING_KVAR, series.decimal(peakLaggingKvar));
            values.put(Register.PEAK_LEADING_KVAR, series.decimal(peakLeadingKvar));
        }
        return new Readings(values);
    }
}
