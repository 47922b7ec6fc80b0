// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.ZoneOffset;
import tariff.csv.DateOrder;

/**
 * A stamp as it is written, packed into a long before it is known whether day or month comes first. Read by hand, for a file
 * has one on every row.
 */
final class Stamp {
    static final long UNREADABLE = -1;

    private static final int ORDERED = 1;
    private static final int HAS_OFFSET = 2;
    private static final int HAS_TIME = 4;
    private static final int HAS_DATE = 8;

    private Stamp() {}

    static long pack(int year, int month, int day, int minute, int flags, int offset) {
        return ((((((long) year << 6 | month) << 6 | day) << 11 | minute) << 4 | flags) << 12) | (offset + 2000);
    }

    static boolean hasTime(long stamp) {
        return (stamp >> 12 & HAS_TIME) != 0;
    }

    static boolean hasDate(long stamp) {
        return (stamp >> 12 & HAS_DATE) != 0;
    }

    static boolean hasOffset(long stamp) {
        return (stamp >> 12 & HAS_OFFSET) != 0;
    }

    /** Whether the writing leaves open which of the first two numbers is the day. */
    static boolean isOpen(long stamp) {
        return (stamp >> 12 & ORDERED) == 0;
    }

    static int offsetMinutes(long stamp) {
        return (int) (stamp & 0xFFF) - 2000;
    }

    /** Minute of the day, 1440 for 24:00. */
    static int minute(long stamp) {
        return (int) (stamp >> 16 & 0x7FF);
    }

    /** The first number of an open date, the day of one that is not. */
    static int first(long stamp) {
        return (int) (stamp >> 27 & 0x3F);
    }

    static int second(long stamp) {
        return (int) (stamp >> 33 & 0x3F);
    }

    private static int year(long stamp) {
        return (int) (stamp >> 39);
    }

    /** A date and a time that stood in two columns. */
    static long join(long date, long time) {
        long dateBits = date & ~(0x7FFL << 16);
        return dateBits | (long) minute(time) << 16 | (long) HAS_TIME << 12;
    }

    /** Minutes since 1970 by the clock of the stamp, or {@link Long#MIN_VALUE} if there is no such date. */
    static long localMinute(long stamp, DateOrder order) {
        boolean swapped = isOpen(stamp) && order == DateOrder.MONTH_FIRST;
        int day = swapped ? second(stamp) : first(stamp);
        int month = swapped ? first(stamp) : second(stamp);
        try {
            return LocalDate.of(year(stamp), month, day).toEpochDay() * 1440 + minute(stamp);
        } catch (DateTimeException noSuchDate) {
            return Long.MIN_VALUE;
        }
    }

    static String words(long localMinute) {
        return LocalDateTime.ofEpochSecond(localMinute * 60, 0, ZoneOffset.UTC)
                .toString()
                .replace('T', ' ');
    }

    /** The stamp, or {@link #UNREADABLE}. */
    static long read(char[] text, int offset, int length) {
        long plain = length == 16 ? plain(text, offset) : UNREADABLE;
        return plain == UNREADABLE ? new Reader(text, offset, length).read() : plain;
    }

    /** 2026-03-01 00:15, as most meters write; unreadable if anything at all is otherwise. */
    private static long plain(char[] text, int at) {
        if (text[at + 4] != '-'
                || text[at + 7] != '-'
                || (text[at + 10] != ' ' && text[at + 10] != 'T')
                || text[at + 13] != ':') {
            return UNREADABLE;
        }
        int year = 100 * two(text, at) + two(text, at + 2);
        int month = two(text, at + 5);
        int day = two(text, at + 8);
        int hour = two(text, at + 11);
        int minute = two(text, at + 14);
        boolean good = year >= 1900 && year <= 2200 && month <= 31 && day <= 31 && hour < 24 && minute < 60;
        return good && (month | day | hour | minute) >= 0
                ? pack(year, month, day, hour * 60 + minute, HAS_DATE | HAS_TIME | ORDERED, 0)
                : UNREADABLE;
    }

    /** Two digits; far below zero if one is none. */
    private static int two(char[] text, int at) {
        int tens = text[at] - '0';
        int ones = text[at + 1] - '0';
        return (tens | ones | (9 - tens) | (9 - ones)) < 0 ? -1_000_000 : 10 * tens + ones;
    }

    static long read(String text) {
        return read(text.toCharArray(), 0, text.length());
    }

    private static final class Reader {
        private final char[] text;
        private int at;
        private int end;

        Reader(char[] text, int offset, int length) {
            this.text = text;
            this.at = offset;
            this.end = offset + length;
        }

        long read() {
            blanks();
            while (end > at && text[end - 1] <= ' ') {
                end--;
            }
            int start = at;
            int a = number();
            int digits = at - start;
            char mark = next();
            if (mark == ':') {
                at = start;
                return time(0, 0, 0, ORDERED);
            }
            if (a < 0 || (mark != '-' && mark != '/' && mark != '.')) {
                return UNREADABLE;
            }
            at++;
            int b = number();
            if (b < 0 || next() != mark) {
                return UNREADABLE;
            }
            at++;
            int yearStart = at;
            int c = number();
            boolean yearFirst = digits == 4;
            if (c < 0 || (!yearFirst && at - yearStart != 4) || b > 31 || (yearFirst ? c : a) > 31) {
                return UNREADABLE;
            }
            int year = yearFirst ? a : c;
            int day = yearFirst ? c : a;
            int flags = HAS_DATE | (yearFirst || mark == '.' ? ORDERED : 0);
            if (year < 1900 || year > 2200) {
                return UNREADABLE;
            }
            if (at == end) {
                return pack(year, b, day, 0, flags, 0);
            }
            if (next() != 'T' && next() != ' ' && next() != ',') {
                return UNREADABLE;
            }
            at++;
            return time(year, b, day, flags);
        }

        private long time(int year, int month, int day, int givenFlags) {
            int flags = givenFlags | HAS_TIME;
            blanks();
            int hour = number();
            if (next() != ':') {
                return UNREADABLE;
            }
            at++;
            int minute = number();
            boolean whole = seconds();
            blanks();
            if (at + 2 == end && (text[at + 1] | 32) == 'm' && hour >= 1 && hour <= 12) {
                boolean pm = (text[at] | 32) == 'p';
                if (!pm && (text[at] | 32) != 'a') {
                    return UNREADABLE;
                }
                hour = hour % 12 + (pm ? 12 : 0);
                at = end;
            }
            int offset = 0;
            if (at < end) {
                offset = offset();
                flags |= HAS_OFFSET;
            }
            boolean inDay = hour >= 0 && minute >= 0 && minute < 60 && (hour < 24 || (hour == 24 && minute == 0));
            boolean good = whole && inDay && at == end && Math.abs(offset) <= 18 * 60;
            return good ? pack(year, month, day, hour * 60 + minute, flags, offset) : UNREADABLE;
        }

        /** Passes over seconds; false unless they are zero. */
        private boolean seconds() {
            boolean zero = true;
            while (next() == ':' || next() == '.') {
                at++;
                zero &= number() == 0;
            }
            return zero;
        }

        /** Z, +01:00, +0100 or +01; beyond any offset if it is none of them. */
        private int offset() {
            char sign = next();
            at++;
            if (sign == 'Z') {
                return 0;
            }
            int start = at;
            int hours = number();
            int digits = at - start;
            int minutes = 0;
            if (digits == 4) {
                minutes = hours % 100;
                hours /= 100;
            } else if (next() == ':') {
                at++;
                minutes = number();
            }
            boolean good = (sign == '+' || sign == '-') && hours >= 0 && minutes >= 0 && minutes < 60;
            return !good ? Integer.MAX_VALUE : (sign == '-' ? -1 : 1) * (hours * 60 + minutes);
        }

        private int number() {
            int value = 0;
            int start = at;
            while (at < end && text[at] >= '0' && text[at] <= '9' && at - start < 9) {
                value = value * 10 + (text[at++] - '0');
            }
            return at == start ? -1 : value;
        }

        private char next() {
            return at < end ? text[at] : 0;
        }

        private void blanks() {
            while (at < end && text[at] <= ' ') {
                at++;
            }
        }
    }
}
