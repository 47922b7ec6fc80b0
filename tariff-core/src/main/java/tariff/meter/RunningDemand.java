// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

/**
 * The energies of one demand interval after another, as the intervals of a series come in. A demand that holds an interval which was
 * skipped is not given, for its average is not known.
 */
public final class RunningDemand {
    private final int steps;
    private final int stride;
    private final long[] kwhs;
    private final long[] laggings;
    private final long[] leadings;
    private int place;
    private int whole;
    private int untilNext;
    private long kwh;
    private long lagging;
    private long leading;

    /** @throws IllegalArgumentException if the series cannot give such a demand */
    public RunningDemand(IntervalSeries series, DemandInterval demand) {
        steps = demand.stepsIn(series);
        stride = demand.sliding() ? 1 : steps;
        kwhs = new long[steps];
        laggings = new long[steps];
        leadings = new long[steps];
        untilNext = steps;
    }

    /** How many intervals a demand is averaged over. */
    public int steps() {
        return steps;
    }

    /** Takes in the next interval, in any unit; whether a demand ends with it, all of whose intervals were taken in. */
    public boolean add(long nextKwh, long nextLagging, long nextLeading) {
        kwh += nextKwh - kwhs[place];
        lagging += nextLagging - laggings[place];
        leading += nextLeading - leadings[place];
        kwhs[place] = nextKwh;
        laggings[place] = nextLagging;
        leadings[place] = nextLeading;
        whole++;
        return moveOn() && whole >= steps;
    }

    /** Passes over the next interval, because it was not recorded or does not count. */
    public void skip() {
        kwh -= kwhs[place];
        lagging -= laggings[place];
        leading -= leadings[place];
        kwhs[place] = 0;
        laggings[place] = 0;
        leadings[place] = 0;
        whole = 0;
        moveOn();
    }

    private boolean moveOn() {
        place = place + 1 == steps ? 0 : place + 1;
        untilNext--;
        boolean ends = untilNext == 0;
        untilNext = ends ? stride : untilNext;
        return ends;
    }

    /** The sum over the demand that ended last, in the unit that was added. */
    public long kwh() {
        return kwh;
    }

    /** As {@link #kwh}. */
    public long lagging() {
        return lagging;
    }

    /** As {@link #kwh}. */
    public long leading() {
        return leading;
    }
}
