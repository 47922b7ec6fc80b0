// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

import java.util.List;

/**
 * A curve over places that it shares with others.
 *
 * @param name written at its end
 * @param values at each place
 * @param marked which of them are marked: kinks of a saving, the month of payback
 */
public record Curve(String name, List<Double> values, List<Integer> marked) {

    /** Throws {@link IllegalArgumentException} for a mark beside the curve or a number that cannot be drawn. */
    public Curve {
        values = List.copyOf(values);
        marked = List.copyOf(marked);
        Numbers.check(name, values);
        for (int mark : marked) {
            if (mark < 0 || mark >= values.size()) {
                throw new IllegalArgumentException(
                        name + " has " + values.size() + " values; no mark can stand at " + mark);
            }
        }
    }

    /** Its last value, as written at its end. */
    String label() {
        double last = values.get(values.size() - 1);
        return name + ": " + Numbers.shown(last, Math.abs(last) < 100 ? 2 : 0);
    }
}
