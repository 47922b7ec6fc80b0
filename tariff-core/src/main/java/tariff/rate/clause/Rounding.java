// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/**
 * A rounding that a rate prescribes: to the nearest step in a direction. {@code { "to": 0.05, "mode": "halfUp" }}.
 *
 * @param to the step, above zero; 1 is a whole number, 0.01 a cent
 * @param mode where a value between two steps goes
 */
public record Rounding(BigDecimal to, RoundingMode mode) {
    /** Finer than anything billed, coarser than what a division or a root leaves behind: an exact half must still be one. */
    private static final int EXACT_DECIMALS = 20;

    private static final Map<String, RoundingMode> MODES = new LinkedHashMap<>();

    static {
        MODES.put("halfUp", RoundingMode.HALF_UP);
        MODES.put("halfDown", RoundingMode.HALF_DOWN);
        MODES.put("halfEven", RoundingMode.HALF_EVEN);
        MODES.put("up", RoundingMode.UP);
        MODES.put("down", RoundingMode.DOWN);
    }

    /** To the cent, half up: what a bill does unless its rate says otherwise. */
    public static Rounding toTheCent() {
        return new Rounding(new BigDecimal("0.01"), RoundingMode.HALF_UP);
    }

    public Rounding {
        if (to.signum() <= 0) {
            throw new IllegalArgumentException("a rounding step of " + to + "; it must be above zero");
        }
    }

    /** Reads {@code to} and {@code mode} among the keys of an object. */
    static Rounding read(Written in) {
        BigDecimal to = in.number("to");
        RoundingMode mode = in.word("mode", MODES, RoundingMode.HALF_UP);
        if (to.signum() <= 0) {
            in.at("to").wrong("number", "must be above zero", "a step such as 1 or 0.01");
            return toTheCent();
        }
        return new Rounding(to, mode);
    }

    /** A rounding in an object of its own under {@code key}, if there is one. */
    public static Optional<Rounding> readOptional(Written in, String key) {
        if (!in.has(key)) {
            return Optional.empty();
        }
        Written object = in.at(key);
        Rounding rounding = read(object);
        object.refuseOtherKeys();
        return Optional.of(rounding);
    }

    public BigDecimal apply(BigDecimal value) {
        BigDecimal exact =
                value.scale() > EXACT_DECIMALS ? value.setScale(EXACT_DECIMALS, RoundingMode.HALF_EVEN) : value;
        if (to.unscaledValue().equals(java.math.BigInteger.ONE)) {
            return exact.setScale(to.scale(), mode);
        }
        return exact.divide(to, 0, mode).multiply(to);
    }

    public Figure apply(Figure figure) {
        BigDecimal rounded = apply(figure.value());
        return rounded.compareTo(figure.value()) == 0
                ? figure
                : Figure.of(rounded, figure.unit(), "{}, " + words(), figure);
    }

    public String words() {
        String step = to.compareTo(BigDecimal.ONE) == 0 ? "a whole number" : Decimals.plain(to);
        return switch (mode) {
            case HALF_UP -> "rounded half up to " + step;
            case HALF_DOWN -> "rounded to " + step + " (a half goes down)";
            case HALF_EVEN -> "rounded to " + step + " (a half goes to the even step)";
            case UP -> "rounded up to " + step;
            default -> "cut off to " + step;
        };
    }
}
