// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.Comparator;
import java.util.PriorityQueue;
import java.util.function.IntFunction;
import tariff.correction.CapacitorBank;

/**
 * The best of many sizes by branch and bound: a span of sizes is halved only while its ceiling is above the best size found, so that
 * steps, edges and plateaus of a rate need no special care. If a size turns out better than the ceiling over it, the rate rewards worse
 * readings somewhere, no ceiling can be trusted, and every size is looked at.
 */
final class SizeSearch {
    /** Beyond what 34-digit arithmetic can put between a ceiling and what lies under it. */
    private static final BigDecimal ARITHMETIC = new BigDecimal("1e-9");

    private final IntFunction<CapacitorBank> sizes;
    private final Objective objective;
    private int best;
    private BigDecimal bestValue;

    private record Span(int from, int to, BigDecimal ceiling) {}

    /** Everything from {@code least} to {@code most} sizes is searched. */
    static CapacitorBank best(int least, int most, IntFunction<CapacitorBank> sizes, Objective objective) {
        SizeSearch search = new SizeSearch(least, sizes, objective);
        if (!search.byCeilings(least, most)) {
            for (int size = least; size <= most; size++) {
                search.look(size);
            }
        }
        return sizes.apply(search.best);
    }

    private SizeSearch(int least, IntFunction<CapacitorBank> sizes, Objective objective) {
        this.sizes = sizes;
        this.objective = objective;
        this.best = least;
        this.bestValue = objective.at(sizes.apply(least));
    }

    /** Whether the ceilings held. */
    private boolean byCeilings(int least, int most) {
        PriorityQueue<Span> spans =
                new PriorityQueue<>(Comparator.comparing(Span::ceiling).reversed());
        Span all = span(least, most);
        boolean held = isUnder(look(most), all);
        spans.add(all);
        for (Span span = spans.poll(); held && span != null; span = spans.poll()) {
            if (span.ceiling().compareTo(bestValue) <= 0) {
                return true;
            }
            if (span.to() - span.from() > 1) {
                int middle = (span.from() + span.to()) >>> 1;
                held = isUnder(look(middle), span);
                spans.add(span(span.from(), middle));
                spans.add(span(middle, span.to()));
            }
        }
        return held;
    }

    private Span span(int from, int to) {
        return new Span(from, to, objective.atMost(sizes.apply(from), sizes.apply(to)));
    }

    private BigDecimal look(int size) {
        BigDecimal value = objective.at(sizes.apply(size));
        int better = value.compareTo(bestValue);
        if (better > 0 || (better == 0 && size < best)) {
            best = size;
            bestValue = value;
        }
        return value;
    }

    private static boolean isUnder(BigDecimal value, Span span) {
        return value.subtract(ARITHMETIC).compareTo(span.ceiling()) <= 0;
    }
}
