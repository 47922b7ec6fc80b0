// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.util.Optional;
import tariff.csv.DateOrder;
import tariff.notice.Finding;

/** Settles whether day or month comes first, and with it what the stamps say. */
final class Dates {
    private final RawColumns rows;
    private final Notices notices;

    Dates(RawColumns rows, Notices notices) {
        this.rows = rows;
        this.notices = notices;
    }

    /** Minutes since 1970 by the stamps' own clock; nothing is left of them once findings say why. */
    long[] localMinutes(Optional<DateOrder> stated) {
        long[] locals = minutes(stated.orElseGet(this::recognised));
        for (int i = 0; i < locals.length; i++) {
            if (locals[i] == Long.MIN_VALUE) {
                notices.error("no-such-date", "row " + rows.lines()[i], "the calendar has no such date");
            }
        }
        return locals;
    }

    private DateOrder recognised() {
        boolean open = false;
        int dayFirst = -1;
        int monthFirst = -1;
        for (int i = 0; i < rows.count(); i++) {
            long stamp = rows.stamps()[i];
            if (Stamp.isOpen(stamp)) {
                open |= Stamp.first(stamp) != Stamp.second(stamp);
                dayFirst = dayFirst < 0 && Stamp.first(stamp) > 12 ? i : dayFirst;
                monthFirst = monthFirst < 0 && Stamp.second(stamp) > 12 ? i : monthFirst;
            }
        }
        if (dayFirst >= 0 && monthFirst >= 0) {
            notices.error(
                    "date-order",
                    "row " + rows.lines()[dayFirst] + " and row " + rows.lines()[monthFirst],
                    "the first has the day before the month, the second the month before the day");
            return DateOrder.DAY_FIRST;
        }
        if (!open || dayFirst >= 0) {
            return DateOrder.DAY_FIRST;
        }
        if (monthFirst >= 0) {
            return DateOrder.MONTH_FIRST;
        }
        int days = runningOn(minutes(DateOrder.DAY_FIRST));
        int months = runningOn(minutes(DateOrder.MONTH_FIRST));
        if (days == months) {
            notices.add(Finding.error(
                            "date-order",
                            "row " + rows.lines()[0],
                            "the dates do not show whether day or month comes first")
                    .allowed("say day first or month first"));
        }
        return days >= months ? DateOrder.DAY_FIRST : DateOrder.MONTH_FIRST;
    }

    private long[] minutes(DateOrder order) {
        long[] locals = new long[rows.count()];
        long lastDate = Stamp.UNREADABLE;
        long midnight = 0;
        for (int i = 0; i < locals.length; i++) {
            long date = rows.stamps()[i] >>> 27;
            if (date != lastDate) {
                long local = Stamp.localMinute(rows.stamps()[i], order);
                lastDate = local == Long.MIN_VALUE ? Stamp.UNREADABLE : date;
                midnight = local == Long.MIN_VALUE ? local : local - Stamp.minute(rows.stamps()[i]);
            }
            locals[i] = midnight == Long.MIN_VALUE ? midnight : midnight + Stamp.minute(rows.stamps()[i]);
        }
        return locals;
    }

    /** How often a row is at most an hour after the one before. */
    private static int runningOn(long[] locals) {
        int count = 0;
        for (int i = 1; i < locals.length; i++) {
            long difference = Math.abs(locals[i] - locals[i - 1]);
            count += difference > 0 && difference <= 60 ? 1 : 0;
        }
        return count;
    }
}
