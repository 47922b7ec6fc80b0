// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import java.util.HashMap;
import java.util.Map;
import java.util.stream.Stream;
import tariff.notice.Finding;
import tariff.rate.clause.Clause;
import tariff.rate.clause.Earlier;
import tariff.rate.clause.Named;
import tariff.rate.clause.Quantity;

/**
 * How much there is to work out for a bill: every clause once for each place that leads to it. Names that use each other twice, over and
 * over, and pasts of pasts grow without end; a rate that a utility prints stays far below the limits.
 */
final class RateSize {
    private static final long MOST_CLAUSES = 200_000;
    private static final int DEEPEST = 400;

    private final RateDefinition rate;
    private final Map<String, Size> named = new HashMap<>();

    /**
     * Of a clause with all that it leads to.
     *
     * @param clauses how many there are to work out
     * @param deep how far they lie inside each other
     */
    private record Size(long clauses, int deep) {
        static final Size ONE = new Size(1, 1);
        static final Size TOO_LARGE = new Size(MOST_CLAUSES + 1, DEEPEST + 1);

        Size and(Size part) {
            return new Size(clauses + part.clauses, Math.max(deep, part.deep + 1)).bounded();
        }

        Size times(int months) {
            return new Size(clauses * months, deep).bounded();
        }

        private Size bounded() {
            return clauses > MOST_CLAUSES || deep > DEEPEST ? TOO_LARGE : this;
        }
    }

    private RateSize(RateDefinition rate) {
        this.rate = rate;
    }

    static boolean isTooLarge(RateDefinition rate) {
        RateSize size = new RateSize(rate);
        Size all = Size.ONE;
        for (Clause clause : Stream.<Clause>concat(rate.quantities().values().stream(), rate.lines().stream())
                .toList()) {
            all = all.and(size.of(clause, 0));
        }
        return all.equals(Size.TOO_LARGE);
    }

    static Finding tooLarge() {
        return Finding.error(
                        "too-large", "", "is too large to be worked out once names and past months are written out")
                .allowed("at most " + MOST_CLAUSES + " clauses, names " + DEEPEST + " deep");
    }

    private Size of(Clause clause, int depth) {
        if (depth > DEEPEST) {
            return Size.TOO_LARGE;
        }
        Size size = Size.ONE;
        if (clause instanceof Named name) {
            size = size.and(ofName(name.name(), depth));
        }
        for (Clause part : clause.parts()) {
            size = size.and(of(part, depth + 1));
        }
        return clause instanceof Earlier past ? size.times(monthsOf(past)) : size;
    }

    /** A named quantity is worked out once for each month and kept, so looking back on it costs nothing more. */
    private static int monthsOf(Earlier past) {
        return past.of() instanceof Named
                ? 1
                : Math.max(past.months(), past.since().isPresent() ? 12 : 1);
    }

    /** A name met inside its own definition counts once: its past is kept, not worked out again. */
    private Size ofName(String name, int depth) {
        Size known = named.get(name);
        Quantity definition = rate.quantities().get(name);
        if (known == null && definition != null) {
            named.put(name, Size.ONE);
            known = of(definition, depth + 1);
            named.put(name, known);
        }
        return known == null ? Size.ONE : known;
    }
}
