// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.List;
import tariff.meter.Unit;

/**
 * A number with its derivation: what it was worked out from, and how. Number and explanation come from the same walk, so they cannot
 * drift apart.
 *
 * @param value exact unless a division or root was needed, then 34 digits
 * @param unit of the value
 * @param how the working with a {@code {}} for each figure in {@code from} ({@code {} × {}}), or the plain name of a figure that was given
 * @param from the figures that the working names, in its order
 */
public record Figure(BigDecimal value, Unit unit, String how, List<Figure> from) {

    /** A figure that was given, not worked out. */
    public static Figure given(BigDecimal value, Unit unit, String name) {
        return new Figure(value, unit, name, List.of());
    }

    /** A number that stands in the rate itself. */
    public static Figure number(BigDecimal value) {
        return new Figure(value, Unit.NUMBER, "", List.of());
    }

    public static Figure of(BigDecimal value, Unit unit, String how, Figure... from) {
        return new Figure(value, unit, how, List.of(from));
    }

    /** The value with its unit, at most six decimals shown: {@code 502.298851 kW}. */
    public String text() {
        String symbol = unit == Unit.MONEY ? "" : unit.symbol();
        return Decimals.shown(value) + (symbol.isEmpty() ? "" : " " + symbol);
    }

    /** One step of the derivation: {@code 502.298851 kW = 460 kW × 0.95 ÷ 0.87}. */
    public String derivation() {
        return how.isEmpty() ? text() : text() + " = " + working();
    }

    /** The right-hand side of the derivation. */
    public String working() {
        StringBuilder out = new StringBuilder();
        int at = 0;
        for (Figure part : from) {
            int hole = how.indexOf("{}", at);
            if (hole < 0) {
                break;
            }
            out.append(how, at, hole).append(part.text());
            at = hole + 2;
        }
        return out.append(how.substring(at)).toString();
    }
}
