// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.List;
import tariff.meter.Unit;

/**
 * The lines that a percentage, a floor or a cap looks at: a list of names, or {@code "all above"}.
 *
 * @param allAbove whether the rate says it in that way; {@code lines} then holds them
 */
record BaseLines(List<String> lines, boolean allAbove) {
    private static final String ALL = "all above";

    static BaseLines read(Written in, String key, List<String> above) {
        if (in.has(key) && in.at(key).isText()) {
            if (!in.at(key).text().equals(ALL)) {
                in.at(key).wrong("lines", "is not a group of lines", "\"all above\", or a list of line names");
            }
            return new BaseLines(List.copyOf(above), true);
        }
        return new BaseLines(in.texts(key), false);
    }

    void check(Scope scope) {
        if (allAbove && lines.isEmpty()) {
            scope.error("lines", "says \"all above\", but no line is above");
        }
        for (int i = 0; !allAbove && i < lines.size(); i++) {
            LineNames.check(lines.get(i), scope.at(i));
            if (lines.indexOf(lines.get(i)) < i) {
                scope.at(i).error("lines", "names the line \"" + lines.get(i) + "\" a second time");
            }
        }
    }

    Figure value(Facts facts) {
        BigDecimal total = BigDecimal.ZERO;
        for (String line : lines) {
            total = total.add(facts.amount(line));
        }
        return Figure.given(total, Unit.MONEY, String.join(" + ", lines));
    }

    String words() {
        return allAbove ? "all lines above" : String.join(" + ", lines);
    }
}
