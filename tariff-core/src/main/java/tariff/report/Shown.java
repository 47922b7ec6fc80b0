// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Stream;
import tariff.correction.Estimate;

/** How numbers are shown: plain in tables, grouped in sentences. */
final class Shown {
    private static final char NARROW_SPACE = '\u202f';
    private static final BigDecimal WORTH_CENTS = BigDecimal.valueOf(1000);

    private Shown() {}

    /** Money in a cell: {@code 1234.50}. */
    static String money(BigDecimal amount) {
        return decimals(amount, 2);
    }

    static String decimals(BigDecimal number, int decimals) {
        return number.setScale(decimals, RoundingMode.HALF_UP).toPlainString();
    }

    /** A number as it was given, without idle zeros. */
    static String plain(BigDecimal number) {
        return number.signum() == 0 ? "0" : number.stripTrailingZeros().toPlainString();
    }

    static String percent(BigDecimal share) {
        return plain(share.movePointRight(2).setScale(4, RoundingMode.HALF_UP));
    }

    /** Whole units, cell empty where nothing was metered. */
    static String whole(Optional<BigDecimal> number) {
        return number.map(value -> decimals(value, 0)).orElse("");
    }

    /** Money in a sentence, with its currency: in whole units from a thousand on, since an estimate has no cents. */
    static String money(BigDecimal amount, String currency) {
        boolean large = amount.abs().compareTo(WORTH_CENTS) >= 0;
        return grouped(decimals(amount, large ? 0 : 2)) + "\u00a0" + currency;
    }

    private static String grouped(String number) {
        int point = number.indexOf('.');
        StringBuilder out = new StringBuilder(number);
        int first = number.startsWith("-") ? 2 : 1;
        for (int at = (point < 0 ? number.length() : point) - 3; at >= first; at -= 3) {
            out.insert(at, NARROW_SPACE);
        }
        return out.toString();
    }

    static String word(Enum<?> constant) {
        return constant.name().toLowerCase(Locale.ROOT).replace('_', ' ');
    }

    /** A row with a cell for each estimate: low, central, high. */
    static List<String> row(String head, Function<Estimate, String> cell) {
        return Stream.concat(Stream.of(head), Stream.of(Estimate.values()).map(cell))
                .toList();
    }

    /** Heads of such a row. */
    static List<String> heads(String first) {
        return row(first, Shown::word);
    }
}
