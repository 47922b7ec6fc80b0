// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.math.BigDecimal;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;

/**
 * What one cell can mean as a number: one value for each decimal mark, equal if the mark does not matter.
 *
 * @param unit the unit written behind the figure, if any
 * @param percent whether a per cent sign follows
 */
record NumberCell(Optional<BigDecimal> point, Optional<BigDecimal> comma, Optional<UnitWord> unit, boolean percent) {
    static final NumberCell NOTHING = new NumberCell(Optional.empty(), Optional.empty(), Optional.empty(), false);
    private static final int LONGEST = 40;
    private static final int MOST_DIGITS = 18;
    private static final int LARGEST_EXPONENT = 12;
    private static final Set<String> ABSENT = Set.of(
            "", "-", "–", "—", "--", "---", "n/a", "na", "n.a.", "n.a", "n/d", "nd", "n.d.", "k.a.", "s/d", "#n/a",
            "#nv", "null", "none", "nil", "?");
    private static final Pattern SHAPE =
            Pattern.compile("(?<open>\\()?(?<sign>[-+−])?\\s*(?<before>(?:\\p{L}+\\.?)?\\p{Sc}?)\\s*"
                    + "(?<sign2>[-+−])?\\s*(?<digits>[.,]?[0-9](?:[0-9.,' ]*[0-9])?)(?<exponent>[eE][+-]?[0-9]{1,3})?"
                    + "\\s*(?<after>%|[\\p{Sc}\\p{L}]*)(?<sign3>[-−])?(?<close>\\))?");

    static boolean isAbsent(String text) {
        String bare = text.toLowerCase(Locale.ROOT).replaceAll("\\p{Sc}", "").strip();
        return ABSENT.contains(bare);
    }

    static NumberCell of(String text) {
        if (text.length() > LONGEST) {
            return NOTHING;
        }
        Matcher shape = SHAPE.matcher(
                text.replace('’', '\'').replace('ʼ', '\'').replace('´', '\'').replace('`', '\''));
        if (!shape.matches() || !isCurrency(shape.group("before"))) {
            return NOTHING;
        }
        String after = shape.group("after");
        Optional<UnitWord> unit = UnitWord.of(after.toLowerCase(Locale.ROOT));
        boolean percent = after.equals("%");
        if (!percent && unit.isEmpty() && !isCurrency(after)) {
            return NOTHING;
        }
        int minuses = (isMinus(shape.group("sign")) ? 1 : 0)
                + (isMinus(shape.group("sign2")) ? 1 : 0)
                + (isMinus(shape.group("sign3")) ? 1 : 0)
                + (shape.group("open") == null ? 0 : 1);
        if (minuses > 1 || (shape.group("open") == null) != (shape.group("close") == null)) {
            return NOTHING;
        }
        String exponent = shape.group("exponent") == null ? "" : shape.group("exponent");
        String digits = shape.group("digits");
        return new NumberCell(
                signed(read(digits, exponent, '.'), minuses),
                signed(read(digits, exponent, ','), minuses),
                unit,
                percent);
    }

    boolean isNothing() {
        return point.isEmpty() && comma.isEmpty();
    }

    boolean isAmbiguous() {
        return point.isPresent() && comma.isPresent() && point.get().compareTo(comma.get()) != 0;
    }

    /** The only decimal mark with which this can be read, if there is only one. */
    Optional<DecimalMark> proves() {
        if (point.isPresent() == comma.isPresent()) {
            return Optional.empty();
        }
        return Optional.of(point.isPresent() ? DecimalMark.POINT : DecimalMark.COMMA);
    }

    Optional<BigDecimal> value(DecimalMark mark) {
        return mark == DecimalMark.POINT ? point : comma;
    }

    /** Without the readings above a limit: a power factor of {@code 1.000} is never a thousand. */
    NumberCell atMost(BigDecimal limit) {
        return new NumberCell(
                point.filter(value -> value.compareTo(limit) <= 0),
                comma.filter(value -> value.compareTo(limit) <= 0),
                unit,
                percent);
    }

    private static Optional<BigDecimal> read(String digits, String exponent, char mark) {
        int at = digits.indexOf(mark);
        String whole = at < 0 ? digits : digits.substring(0, at);
        String fraction = at < 0 ? "" : digits.substring(at + 1);
        if (!fraction.matches("[0-9]*") || !isWhole(whole)) {
            return Optional.empty();
        }
        String bare = whole.replaceAll("[^0-9]", "");
        int power =
                exponent.isEmpty() ? 0 : Integer.parseInt(exponent.substring(1).replace("+", ""));
        if (bare.length() + fraction.length() > MOST_DIGITS || Math.abs(power) > LARGEST_EXPONENT) {
            return Optional.empty();
        }
        BigDecimal value = new BigDecimal(bare + "." + fraction + "0")
                .setScale(fraction.length())
                .scaleByPowerOfTen(power);
        return Optional.of(value.scale() < 0 ? value.setScale(0) : value);
    }

    private static boolean isWhole(String whole) {
        return whole.matches("[0-9]*")
                || whole.matches("[1-9][0-9]{0,2}([., '])[0-9]{3}(\\1[0-9]{3})*")
                || whole.matches("[1-9][0-9]?(,[0-9]{2})+,[0-9]{3}"); // lakh and crore, as written in India
    }

    private static Optional<BigDecimal> signed(Optional<BigDecimal> value, int minuses) {
        return minuses == 1 ? value.map(BigDecimal::negate) : value;
    }

    private static boolean isMinus(@Nullable String sign) {
        return sign != null && !sign.equals("+");
    }

    private static boolean isCurrency(String text) {
        String bare = text.replaceAll("[\\p{Sc}.]", "").toLowerCase(Locale.ROOT);
        return bare.isEmpty() || bare.equals("r") || bare.equals("us") || Currencies.WORDS.contains(bare);
    }
}
