// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.time.Instant;
import java.time.YearMonth;
import java.time.ZoneId;
import java.util.Arrays;
import java.util.BitSet;
import tariff.meter.IntervalSeries;
import tariff.meter.Period;

/** Finds the intervals that are missing and does what the caller chose, saying so gap by gap and month by month. */
final class Gaps {
    private final Energies energies;
    private final Timeline time;
    private final Notices notices;
    private final long firstMinute;

    Gaps(Energies energies, Timeline time, Notices notices, long firstMinute) {
        this.energies = energies;
        this.time = time;
        this.notices = notices;
        this.firstMinute = firstMinute;
    }

    /**
     * @param counter whether the first place only holds the reading that counting began from
     * @throws tariff.notice.Refusal if gaps are refused, or nothing is left
     */
    IntervalSeries series(GapRule rule, boolean counter) {
        int size = energies.active().length;
        int from = counter ? 1 : 0;
        BitSet absent = new BitSet(size);
        BitSet filled = new BitSet(size);
        for (int slot = from; slot < size; slot++) {
            if (!energies.isWhole(slot)) {
                absent.set(slot);
            }
        }
        if (absent.cardinality() >= size - from) {
            notices.error("no-intervals", "", "no interval has all its figures");
            notices.refuseIfWrong();
        }
        for (int slot = absent.nextSetBit(0); slot >= 0; slot = absent.nextSetBit(absent.nextClearBit(slot))) {
            int end = absent.nextClearBit(slot);
            boolean inside = slot > from && end < size;
            if (rule == GapRule.INTERPOLATE && inside) {
                fill(slot, end);
                filled.set(slot, end);
            }
            report(slot, end, rule, inside);
        }
        absent.andNot(filled);
        notices.refuseIfWrong();
        return new IntervalSeries(
                moment(from),
                time.stepMinutes(),
                time.zone(),
                Rows.SCALE,
                kept(energies.active(), from),
                kept(energies.lagging(), from),
                kept(energies.leading(), from),
                energies.exported().map(values -> kept(values, from)),
                absent.get(from, size));
    }

    private static long[] kept(long[] values, int from) {
        return from == 0 ? values : Arrays.copyOfRange(values, from, values.length);
    }

    private void fill(int from, int to) {
        line(energies.active(), from, to);
        line(energies.lagging(), from, to);
        line(energies.leading(), from, to);
        energies.exported().ifPresent(values -> line(values, from, to));
    }

    /** Fills only what has no figure, between the nearest that have. */
    private static void line(long[] values, int from, int to) {
        long left = values[from - 1];
        long right = values[to];
        for (int slot = from; slot < to; slot++) {
            if (values[slot] == Grid.NONE) {
                double share = (slot - from + 1.0) / (to - from + 1.0);
                values[slot] = left + Math.round((right - left) * share);
            }
        }
    }

    private void report(int from, int to, GapRule rule, boolean inside) {
        if (rule == GapRule.REFUSE) {
            notices.error("gap", local(from) + " to " + local(to), missing(to - from));
            return;
        }
        int slot = from;
        while (slot < to) {
            YearMonth month = YearMonth.from(moment(slot).atZone(time.zone()));
            int end = Math.min(to, Math.max(slot + 1, slotAt(month.plusMonths(1))));
            boolean isFilled = rule == GapRule.INTERPOLATE && inside;
            notices.assume(
                    isFilled ? "gap-filled" : "gap-left-out",
                    month.toString(),
                    missing(end - slot) + " from " + local(slot) + " to " + local(end) + ", " + share(end - slot, month)
                            + " of the month; "
                            + (isFilled ? "filled in a straight line between the neighbours" : "left out of every sum"),
                    "give the meter's own values for these intervals");
            slot = end;
        }
    }

    private static String missing(int count) {
        return count == 1 ? "1 interval is missing" : count + " intervals are missing";
    }

    private String share(int count, YearMonth month) {
        Period period = Period.of(month);
        ZoneId zone = time.zone();
        long minutes = (period.last().plusDays(1).atStartOfDay(zone).toEpochSecond()
                        - period.first().atStartOfDay(zone).toEpochSecond())
                / 60;
        return BigDecimal.valueOf(100L * count * time.stepMinutes())
                        .divide(BigDecimal.valueOf(minutes), 2, RoundingMode.HALF_UP)
                + " %";
    }

    private int slotAt(YearMonth month) {
        long minute = month.atDay(1).atStartOfDay(time.zone()).toEpochSecond() / 60;
        return (int) -Math.floorDiv(firstMinute - minute, time.stepMinutes());
    }

    private Instant moment(int slot) {
        return Instant.ofEpochSecond((firstMinute + (long) slot * time.stepMinutes()) * 60);
    }

    private String local(int slot) {
        return moment(slot).atZone(time.zone()).toLocalDateTime().toString().replace('T', ' ');
    }
}
