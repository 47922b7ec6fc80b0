// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import java.util.ArrayDeque;
import java.util.Collections;
import java.util.Deque;
import java.util.IdentityHashMap;
import java.util.Set;
import tariff.meter.Unit;
import tariff.rate.clause.Figure;

/**
 * A derivation as a tree: value, unit, how, and the figures it came from. The steps nearest to the result are told, each once, up to
 * 24: a ratchet that leans on its own past would double with every month.
 */
final class FigureJson {
    private static final int MOST_STEPS = 24;

    private final Set<Figure> toTell = Collections.newSetFromMap(new IdentityHashMap<>());

    private FigureJson(Figure result) {
        Deque<Figure> next = new ArrayDeque<>();
        next.add(result);
        while (!next.isEmpty() && toTell.size() < MOST_STEPS) {
            Figure figure = next.remove();
            if (!figure.from().isEmpty() && toTell.add(figure)) {
                next.addAll(figure.from());
            }
        }
    }

    static JsonObject write(Figure figure) {
        return new FigureJson(figure).tree(figure);
    }

    private JsonObject tree(Figure figure) {
        JsonObject json = new JsonObject().with("value", figure.value());
        if (figure.unit() != Unit.NUMBER) {
            json.with("unit", figure.unit().symbol());
        }
        if (!figure.how().isEmpty()) {
            json.with("how", figure.working());
        }
        return toTell.remove(figure) ? json.withAll("from", figure.from(), this::tree) : json;
    }
}
