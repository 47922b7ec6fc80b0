// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.regex.Pattern;
import java.util.stream.LongStream;

/** Reads figures into scaled whole numbers, digit by digit where they are plain. */
final class Decimals {
    static final long EMPTY = Long.MIN_VALUE;
    static final long UNREADABLE = Long.MIN_VALUE + 1;
    /** Beyond any figure of a meter. */
    static final long LARGEST = 1L << 50;

    private static final long[] POWERS =
            LongStream.iterate(1, power -> 10 * power).limit(19).toArray();
    /** The most that may still be multiplied by each of the powers. */
    private static final long[] MOST =
            LongStream.of(POWERS).map(power -> LARGEST / power).toArray();

    private static final Pattern EXPONENT = Pattern.compile("[+-]?\\d{1,20}(\\.\\d{0,20})?([eE][+-]?\\d{1,2})?");
    private static final Pattern POINT = Pattern.compile("[+-]?\\d{1,3}([,'\\h]\\d{3})+(\\.\\d+)?");
    private static final Pattern COMMA = Pattern.compile("[+-]?\\d{1,3}([.'\\h]\\d{3})+(,\\d+)?");

    private final char mark;
    private long rounded;

    /** @param mark the decimal mark, or 0 if the data have not shown which */
    Decimals(char mark) {
        this.mark = mark;
    }

    /** How many figures had more decimals than are kept. */
    long rounded() {
        return rounded;
    }

    /** The figure × 10<sup>scale</sup>, half up; {@link #EMPTY} for nothing but blanks, {@link #UNREADABLE} for no figure. */
    long read(char[] text, int offset, int length, int scale) {
        int at = offset;
        int end = offset + length;
        while (at < end && text[at] <= ' ') {
            at++;
        }
        while (end > at && text[end - 1] <= ' ') {
            end--;
        }
        if (at == end) {
            return EMPTY;
        }
        boolean negative = text[at] == '-';
        int first = negative || text[at] == '+' ? at + 1 : at;
        if (first == end || end - first > 15) {
            return general(new String(text, at, end - at), scale);
        }
        long value = 0;
        int i = first;
        while (i < end && isDigit(text[i])) {
            value = value * 10 + (text[i++] - '0');
        }
        int decimals = 0;
        if (i < end && isMark(text[i]) && end - first > 1) {
            int start = ++i;
            while (i < end && isDigit(text[i])) {
                value = value * 10 + (text[i++] - '0');
            }
            decimals = i - start;
        }
        if (i < end || decimals > scale) {
            return general(new String(text, at, end - at), scale);
        }
        long power = POWERS[scale - decimals];
        if (value > MOST[scale - decimals]) {
            return UNREADABLE;
        }
        return negative ? -value * power : value * power;
    }

    private static boolean isDigit(char c) {
        return c >= '0' && c <= '9';
    }

    private boolean isMark(char c) {
        return c == mark || (mark == 0 && (c == '.' || c == ','));
    }

    private long general(String text, int scale) {
        String plain = text;
        if (mark != ',' && POINT.matcher(text).matches()) {
            plain = text.replaceAll("[,'\\h]", "");
        } else if (mark == ',' && COMMA.matcher(text).matches()) {
            plain = text.replaceAll("[.'\\h]", "").replace(',', '.');
        } else if (mark != '.' && text.indexOf('.') < 0) {
            plain = text.replace(',', '.');
        } else if (mark == ',') {
            return UNREADABLE;
        }
        if (!EXPONENT.matcher(plain).matches()) {
            return UNREADABLE;
        }
        BigDecimal exact = new BigDecimal(plain).movePointRight(scale);
        if (exact.abs().compareTo(BigDecimal.valueOf(LARGEST)) > 0) {
            return UNREADABLE;
        }
        BigDecimal whole = exact.setScale(0, RoundingMode.HALF_UP);
        rounded += whole.compareTo(exact) == 0 ? 0 : 1;
        return whole.longValueExact();
    }
}
