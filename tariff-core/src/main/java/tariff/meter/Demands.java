// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

/**
 * Walks the demand intervals of a stretch. One that holds an absent interval is passed over, for its average is not known; one
 * that is only partly in the window likewise.
 */
final class Demands {
    private final IntervalSeries series;
    private final WindowCalendar calendar;
    private final int steps;
    private final int stride;

    /** What is done with a demand interval that starts at the given interval; energies are scaled like the series. */
    interface Visitor {
        void visit(int start, long kwh, long laggingKvarh, long leadingKvarh);
    }

    Demands(IntervalSeries series, WindowCalendar calendar, DemandInterval demand) {
        this.series = series;
        this.calendar = calendar;
        this.steps = demand.stepsIn(series);
        this.stride = demand.sliding() ? 1 : steps;
    }

    /** @param window the bit of the window to stay in, 0 for none */
    void walk(IntervalRange range, long window, Visitor visitor) {
        for (int start = range.from(); start + steps <= range.to(); start += stride) {
            long kwh = 0;
            long lagging = 0;
            long leading = 0;
            boolean whole = true;
            for (int i = start; i < start + steps; i++) {
                whole &= !series.isAbsent(i) && (calendar.mask(i) & window) == window;
                kwh += series.scaledKwh(i);
                lagging += series.scaledLaggingKvarh(i);
                leading += series.scaledLeadingKvarh(i);
            }
            if (whole) {
                visitor.visit(start, kwh, lagging, leading);
            }
        }
    }
}
