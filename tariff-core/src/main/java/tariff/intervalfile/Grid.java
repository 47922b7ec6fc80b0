// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.util.Arrays;
import java.util.EnumMap;
import java.util.Map;

/** Puts rows in their places in time, whatever their order in the file. A place without a figure is {@link #NONE}. */
final class Grid {
    static final long NONE = Decimals.EMPTY;
    private static final int RUN = 8;

    private final RawColumns rows;
    private final Timeline time;
    private final Notices notices;
    private final Map<Role, long[]> figures = new EnumMap<>(Role.class);
    private long first;
    private int[] rowOf = {};

    Grid(RawColumns rows, Timeline time, Notices notices) {
        this.rows = rows;
        this.time = time;
        this.notices = notices;
    }

    /** @throws tariff.notice.Refusal if rows contradict each other or do not stand at the step */
    void place() {
        allocate();
        boolean inPlace = isInPlace();
        if (!inPlace) {
            placeRows();
            notices.refuseIfWrong();
        }
        rows.figures()
                .forEach((role, values) ->
                        figures.put(role, inPlace ? Arrays.copyOf(values, rowOf.length) : placed(values)));
    }

    /** Whether the rows stand in the file as they do in time, as most do. */
    private boolean isInPlace() {
        for (int row = 0; row < rows.count(); row++) {
            if (time.starts()[row] != first + (long) row * time.stepMinutes()) {
                Arrays.fill(rowOf, -1);
                return false;
            }
            rowOf[row] = row;
        }
        return true;
    }

    private void placeRows() {
        long latest = Long.MIN_VALUE;
        int offStepRun = 0;
        long difference = 0;
        for (int row = 0; row < rows.count(); row++) {
            long start = time.starts()[row];
            if (row > 0) {
                long now = start - time.starts()[row - 1];
                offStepRun =
                        now == difference && now > 0 && now <= 60 && now != time.stepMinutes() ? offStepRun + 1 : 0;
                difference = now;
                if (offStepRun == RUN - 1) {
                    notices.error(
                            "changed-step",
                            where(row - RUN),
                            "from here on rows are " + now + " minutes apart instead of " + time.stepMinutes());
                }
            }
            long slot = (start - first) / time.stepMinutes();
            if (first + slot * time.stepMinutes() != start) {
                notices.error(
                        "off-step",
                        where(row),
                        "is not a whole number of " + time.stepMinutes() + "-minute steps from the first row");
                continue;
            }
            if (start < latest) {
                notices.warning("out-of-order", where(row), "stands after a later row; put in its place by its stamp");
            }
            latest = Math.max(latest, start);
            place(row, (int) slot);
        }
    }

    private void allocate() {
        int earliest = 0;
        int last = 0;
        for (int row = 1; row < rows.count(); row++) {
            earliest = time.starts()[row] < time.starts()[earliest] ? row : earliest;
            last = time.starts()[row] > time.starts()[last] ? row : last;
        }
        first = time.starts()[earliest];
        long places = (time.starts()[last] - first) / time.stepMinutes() + 1;
        if (places > 20L * rows.count() + 1000) {
            notices.error(
                    "span",
                    where(earliest) + " to " + where(last),
                    places + " intervals lie between the first and the last stamp, and the file has " + rows.count()
                            + " rows");
            notices.refuseIfWrong();
        }
        rowOf = new int[(int) places];
    }

    private void place(int row, int slot) {
        if (rowOf[slot] >= 0) {
            boolean same = rows.figures().values().stream().allMatch(values -> values[row] == values[rowOf[slot]]);
            String other = "row " + rows.lines()[rowOf[slot]];
            if (same) {
                notices.warning("repeated", where(row), "repeats " + other + " with the same figures; left out");
            } else {
                notices.error("repeated-differently", where(row), "has the stamp of " + other + " and other figures");
            }
            return;
        }
        rowOf[slot] = row;
    }

    private long[] placed(long[] values) {
        long[] placed = new long[rowOf.length];
        for (int slot = 0; slot < placed.length; slot++) {
            placed[slot] = rowOf[slot] < 0 ? NONE : values[rowOf[slot]];
        }
        return placed;
    }

    int size() {
        return rowOf.length;
    }

    long firstMinute() {
        return first;
    }

    Map<Role, long[]> figures() {
        return figures;
    }

    /** The row that a place was filled from, for messages. */
    String whereSlot(int slot) {
        return rowOf[slot] < 0 ? "" : where(rowOf[slot]);
    }

    private String where(int row) {
        return "row " + rows.lines()[row] + " (" + Stamp.words(time.locals()[row]) + ")";
    }
}
