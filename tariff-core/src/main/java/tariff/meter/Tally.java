// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.math.BigDecimal;
import java.util.EnumMap;
import java.util.Map;

/** Counts the registers of a stretch of intervals, in scaled whole numbers. */
final class Tally {
    private final MonthlySums sums;
    private final IntervalSeries series;
    private final long window;
    private int intervals;
    private int present;
    private long kwh;
    private long laggingKvarh;
    private long leadingKvarh;
    private long exportedKwh;
    private long apparentKvah;
    private boolean anyDemand;
    private long mostKwh;
    private long mostLagging;
    private long mostLeading;
    private long mostSquared;
    private long mostApparent;

    private Tally(MonthlySums sums, long window) {
        this.sums = sums;
        this.series = sums.series();
        this.window = window;
    }

    /** @param window the bit of the window to count in, 0 for all */
    static Readings readings(MonthlySums sums, IntervalRange range, long window) {
        Tally tally = new Tally(sums, window);
        boolean demandIsStep = sums.demand().stepsIn(sums.series()) == 1;
        tally.count(range, demandIsStep);
        if (!demandIsStep) {
            new Demands(sums.series(), sums.calendar(), sums.demand())
                    .walk(range, window, (start, active, lagging, leading) -> tally.demand(active, lagging, leading));
        }
        return tally.readings();
    }

    private void count(IntervalRange range, boolean demandIsStep) {
        WindowCalendar calendar = sums.calendar();
        boolean kvah = sums.apparentKvah();
        for (int i = range.from(); i < range.to(); i++) {
            if (window != 0 && (calendar.mask(i) & window) == 0) {
                continue;
            }
            intervals++;
            if (series.isAbsent(i)) {
                continue;
            }
            present++;
            long active = series.scaledKwh(i);
            long lagging = series.scaledLaggingKvarh(i);
            long leading = series.scaledLeadingKvarh(i);
            kwh += active;
            laggingKvarh += lagging;
            leadingKvarh += leading;
            exportedKwh += series.scaledExportedKwh(i);
            if (kvah) {
                apparentKvah += Apparent.of(active, lagging - leading);
            }
            if (demandIsStep) {
                demand(active, lagging, leading);
            }
        }
    }

    private void demand(long active, long lagging, long leading) {
        anyDemand = true;
        mostKwh = Math.max(mostKwh, active);
        mostLagging = Math.max(mostLagging, lagging);
        mostLeading = Math.max(mostLeading, leading);
        long reactive = lagging - leading;
        if (Apparent.squaresFit(active, reactive)) {
            long squared = active * active + reactive * reactive;
            if (squared > mostSquared) {
                mostSquared = squared;
                mostApparent = Math.max(mostApparent, perHour(active, reactive));
            }
        } else {
            mostApparent = Math.max(mostApparent, perHour(active, reactive));
        }
    }

    /** kVA of a demand interval, rounded after it is brought to the hour. */
    private long perHour(long active, long reactive) {
        return Apparent.of(
                active * sums.demand().perHour(), reactive * sums.demand().perHour());
    }

    private Readings readings() {
        if (intervals > 0 && present == 0) {
            return Readings.none();
        }
        Map<Register, BigDecimal> values = new EnumMap<>(Register.class);
        values.put(Register.ENERGY_KWH, series.decimal(kwh));
        values.put(Register.LAGGING_KVARH, series.decimal(laggingKvarh));
        values.put(Register.LEADING_KVARH, series.decimal(leadingKvarh));
        if (sums.apparentKvah()) {
            values.put(Register.APPARENT_KVAH, series.decimal(apparentKvah));
        }
        if (series.hasExport()) {
            values.put(Register.EXPORTED_KWH, series.decimal(exportedKwh));
        }
        if (anyDemand || intervals == 0) {
            int perHour = sums.demand().perHour();
            values.put(Register.PEAK_KW, series.decimal(mostKwh * perHour));
            values.put(Register.PEAK_KVA, series.decimal(mostApparent));
            values.put(Register.PEAK_LAGGING_KVAR, series.decimal(mostLagging * perHour));
            values.put(Register.PEAK_LEADING_KVAR, series.decimal(mostLeading * perHour));
        }
        return new Readings(values);
    }
}
