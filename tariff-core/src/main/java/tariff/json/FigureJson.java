// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import java.util.Collections;
import java.util.IdentityHashMap;
import java.util.Set;
import tariff.meter.Unit;
import tariff.rate.clause.Figure;

/**
 * A derivation as a tree: value, unit, how, and the figures it came from. A figure that came up before in the same tree is given
 * without what it came from, so that a ratchet over many months stays readable.
 */
final class FigureJson {
    private static final int DEEPEST = 30;

    private final Set<Figure> explained = Collections.newSetFromMap(new IdentityHashMap<>());

    private FigureJson() {}

    static JsonObject write(Figure figure) {
        return new FigureJson().write(figure, 0);
    }

    private JsonObject write(Figure figure, int depth) {
        JsonObject json = new JsonObject().with("value", figure.value());
        if (figure.unit() != Unit.NUMBER) {
            json.with("unit", figure.unit().symbol());
        }
        if (!figure.how().isEmpty()) {
            json.with("how", figure.working());
        }
        boolean explain = depth < DEEPEST && !figure.from().isEmpty() && explained.add(figure);
        return explain ? json.withAll("from", figure.from(), part -> write(part, depth + 1)) : json;
    }
}
