// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.NavigableSet;
import java.util.Optional;
import tariff.meter.IntervalSeries;
import tariff.notice.Finding;

/** From stamps to the timeline: the step, which end is stamped, the day's last row, daylight saving. */
final class Clockwork {
    private static final int HOUR = 60;
    private static final int DAY = 24 * HOUR;

    private final RawColumns rows;
    private final IntervalFileOptions options;
    private final Notices notices;
    private long[] locals = {};
    private int step;

    Clockwork(RawColumns rows, IntervalFileOptions options, Notices notices) {
        this.rows = rows;
        this.options = options;
        this.notices = notices;
    }

    /** @throws tariff.notice.Refusal if the stamps cannot be understood */
    Timeline timeline(Optional<StampAt> byHeader) {
        locals = new Dates(rows, notices).localMinutes(options.dateOrder());
        notices.refuseIfWrong();
        if (isNewestFirst()) {
            rows.reverse();
            locals = new Dates(rows, notices).localMinutes(options.dateOrder());
            notices.warning("newest-first", "", "the file has its newest row first; read from the end");
        }
        step = step();
        Optional<ZoneId> zone = zone();
        notices.refuseIfWrong();
        boolean sameDayMidnight = moveMidnights();
        Optional<StampAt> at = options.counter()
                ? Optional.of(StampAt.END)
                : options.stampAt().or(() -> byHeader).or(() -> sameDayMidnight ? Optional.of(StampAt.END) : byEdges());
        if (at.isEmpty()) {
            notices.add(Finding.error(
                            "stamp-end",
                            "",
                            "the data do not show whether a stamp marks the start or the end of its interval")
                    .found("first " + Stamp.words(locals[0]) + ", last " + Stamp.words(locals[locals.length - 1]))
                    .allowed("say start or end"));
        }
        notices.refuseIfWrong();
        boolean ends = at.orElseThrow() == StampAt.END;
        long[] starts = moments(zone.orElseThrow(), ends);
        if (ends) {
            for (int i = 0; i < starts.length; i++) {
                starts[i] -= step;
            }
        }
        return new Timeline(starts, locals, step, zone.orElseThrow());
    }

    private boolean isNewestFirst() {
        int falling = 0;
        for (int i = 1; i < locals.length; i++) {
            falling += locals[i] < locals[i - 1] ? 1 : 0;
        }
        return locals.length > 2 && falling > (locals.length - 1) * 0.9;
    }

    private int step() {
        int[] counts = new int[61];
        for (int i = 1; i < locals.length; i++) {
            long difference = locals[i] - locals[i - 1];
            if (difference > 0 && difference <= 60) {
                counts[(int) difference]++;
            }
        }
        int best = 1;
        for (int minutes = 1; minutes <= 60; minutes++) {
            best = counts[minutes] > counts[best] ? minutes : best;
        }
        if (IntervalSeries.isStep(best) && counts[best] > 0) {
            return best;
        }
        notices.add(Finding.error("step", "", "rows do not follow one another at the step of a meter")
                .found(counts[best] == 0 ? "no two rows within an hour" : best + " minutes")
                .allowed("5, 10, 15, 30 or 60 minutes"));
        return 60;
    }

    private Optional<ZoneId> zone() {
        int with = 0;
        boolean same = true;
        for (int i = 0; i < rows.count(); i++) {
            long stamp = rows.stamps()[i];
            with += Stamp.hasOffset(stamp) ? 1 : 0;
            same &= Stamp.offsetMinutes(stamp) == Stamp.offsetMinutes(rows.stamps()[0]);
        }
        if (with != 0 && with != rows.count()) {
            notices.error(
                    "offset", "", with + " of " + rows.count() + " stamps carry an offset from UTC; all must or none");
        } else if (options.zone().isEmpty() && with > 0 && same) {
            return Optional.of(ZoneOffset.ofTotalSeconds(60 * Stamp.offsetMinutes(rows.stamps()[0])));
        } else if (options.zone().isEmpty()) {
            notices.add(Finding.error("zone", "", "the time zone of the bill is not known")
                    .allowed("name one, such as Europe/Berlin, or a fixed offset such as +01:00"));
        }
        return options.zone();
    }

    /** Moves to the end of their day the rows that end a day but are stamped 00:00 of it instead of the next. */
    private boolean moveMidnights() {
        int moved = 0;
        int first = 0;
        int perDay = DAY / step;
        for (int i = 1; i < locals.length; i++) {
            boolean endsDay = locals[i] == locals[i - 1] + step - DAY && Math.floorMod(locals[i], DAY) == 0;
            boolean goesOn = i + 1 < locals.length
                    ? followsMidnight(locals[i + 1] - locals[i] - DAY)
                    : i < perDay - 1 || locals[i - perDay + 1] != locals[i];
            if (endsDay && goesOn) {
                locals[i] += DAY;
                first = moved++ == 0 ? i : first;
            }
        }
        if (moved > 0) {
            notices.assume(
                    "midnight-same-day",
                    "row " + rows.lines()[first],
                    moved + " rows that end a day are stamped 00:00 of that day; read as 00:00 of the next",
                    "stamp the end of a day 00:00 of the next day or 24:00");
        }
        return moved > 0;
    }

    /** Whether a row so long after midnight is the next; an hour more or less where clocks change at midnight. */
    private boolean followsMidnight(long minutes) {
        return minutes == step || Math.abs(minutes - step) == HOUR;
    }

    private Optional<StampAt> byEdges() {
        long first = Math.floorMod(locals[0], DAY);
        long last = Math.floorMod(locals[locals.length - 1], DAY);
        if (first == 0 && last == DAY - step) {
            return Optional.of(StampAt.START);
        }
        return first == step && last == 0 ? Optional.of(StampAt.END) : Optional.empty();
    }

    private long[] moments(ZoneId zone, boolean ends) {
        LocalClock clock = new LocalClock(zone);
        long[] moments = new long[locals.length];
        long latest = Long.MIN_VALUE / 2;
        for (int i = 0; i < moments.length; i++) {
            long stamp = rows.stamps()[i];
            if (Stamp.hasOffset(stamp)) {
                moments[i] = locals[i] - Stamp.offsetMinutes(stamp);
            } else if (clock.isPlain(locals[i], step)) {
                moments[i] = clock.moment(locals[i]);
            } else {
                moments[i] = nearChange(i, clock.moments(locals[i], step, ends), latest, zone);
            }
            latest = Math.max(latest, moments[i]);
        }
        return moments;
    }

    /** The moment that goes on from the row before; else the only one later than it, or the first of two that both are shown. */
    private long nearChange(int row, NavigableSet<Long> possible, long latest, ZoneId zone) {
        String where = "row " + rows.lines()[row] + " (" + Stamp.words(locals[row]) + ")";
        if (possible.isEmpty()) {
            notices.add(Finding.error("skipped-hour", where, "clocks in " + zone + " skipped this hour")
                    .allowed("give the meter's own clock as zone, such as +01:00 for one that has no summer time"));
            return locals[row];
        }
        if (possible.contains(latest + step)) {
            return latest + step;
        }
        var later = possible.tailSet(latest, false);
        if ((later.size() > 1 && !comesAgain(row)) || (later.isEmpty() && possible.size() > 1)) {
            notices.add(Finding.error(
                            "repeated-hour",
                            where,
                            "clocks in " + zone + " showed this time twice, and the rows before"
                                    + " do not tell which is meant")
                    .allowed("stamps with their offset from UTC"));
        }
        return later.isEmpty() ? possible.first() : later.first();
    }

    /** Whether the row an hour on has the same stamp, so that this is the first of the two. */
    private boolean comesAgain(int row) {
        int hourOn = row + HOUR / step;
        return hourOn < locals.length && locals[hourOn] == locals[row];
    }
}
