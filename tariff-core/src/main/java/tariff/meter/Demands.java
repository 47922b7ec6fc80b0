// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

/**
 * Walks the demand intervals of a stretch. One that holds an absent interval is passed over, for its average is not known; one
 * that is only partly in the window likewise.
 */
final class Demands {
    private final IntervalSeries series;
    private final WindowCalendar calendar;
    private final DemandInterval demand;

    /** What is done with a demand interval that starts at the given interval; energies are scaled like the series. */
    interface Visitor {
        void visit(int start, long kwh, long laggingKvarh, long leadingKvarh);
    }

    Demands(IntervalSeries series, WindowCalendar calendar, DemandInterval demand) {
        this.series = series;
        this.calendar = calendar;
        this.demand = demand;
    }

    /** @param window the bit of the window to stay in, 0 for none */
    void walk(IntervalRange range, long window, Visitor visitor) {
        RunningDemand running = new RunningDemand(series, demand);
        for (int i = range.from(); i < range.to(); i++) {
            if (series.isAbsent(i) || (calendar.mask(i) & window) != window) {
                running.skip();
            } else if (running.add(series.scaledKwh(i), series.scaledLaggingKvarh(i), series.scaledLeadingKvarh(i))) {
                visitor.visit(i + 1 - running.steps(), running.kwh(), running.lagging(), running.leading());
            }
        }
    }
}
