// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import tariff.rate.RateSource;

/** Demand is rounded otherwise than the rate says: the one billed, or the one metered before anything is done to it. */
record DemandRounding() implements Cause {
    private static final String ROUNDED = "rounded";
    private static final String QUANTITY = "quantity";
    private static final List<Steps> WAYS = List.of(
            Steps.NONE,
            new Steps("1", "halfUp"),
            new Steps("1", "up"),
            new Steps("1", "down"),
            new Steps("0.1", "halfUp"));

    @Override
    public String code() {
        return "demand-rounding";
    }

    @Override
    public Stream<Trial> trials(Case bills) {
        if (!bills.source().mentions("peak")) {
            return Stream.empty();
        }
        Stream<Trial> billed = WAYS.stream()
                .flatMap(way -> bills.written(this, "the billed demand " + way.words(), billed(bills.source(), way)));
        boolean brokenPeaks = bills.anyMonth(month -> month.totals().values().entrySet().stream()
                .anyMatch(each -> each.getKey().isPeak()
                        && each.getValue().stripTrailingZeros().scale() > 0));
        Stream<Trial> metered = !brokenPeaks
                ? Stream.empty()
                : WAYS.stream()
                        .filter(way -> !way.isNone())
                        .flatMap(way -> bills.rewritten(
                                this,
                                "the metered demand " + way.words(),
                                value -> value instanceof Map<?, ?> map && map.containsKey("peak")
                                        ? rounded(map, way)
                                        : value));
        return Stream.concat(billed, metered);
    }

    /** Roundings that the rate has are replaced; where it has none, each line's demand gets one. */
    private static RateSource billed(RateSource source, Steps way) {
        if (source.mentions(ROUNDED)) {
            return source.rewritten(value -> value instanceof Map<?, ?> map ? replaced(map, way) : value);
        }
        return way.isNone()
                ? source
                : source.rewritten(value -> value instanceof Map<?, ?> map ? added(source, map, way) : value);
    }

    private static Object replaced(Map<?, ?> rounding, Steps way) {
        Optional<Object> inner =
                Keys.get(rounding, ROUNDED).filter(quantity -> !RateSource.mentions(quantity, "energy"));
        if (inner.isEmpty() || way.same(rounding)) {
            return rounding;
        }
        return way.isNone() ? inner.get() : rounded(inner.get(), way);
    }

    private static Object added(RateSource source, Map<?, ?> line, Steps way) {
        return Keys.get(line, QUANTITY)
                .filter(quantity -> isDemand(meant(source, quantity)))
                .map(quantity -> Keys.with(line, QUANTITY, rounded(quantity, way)))
                .orElseGet(() -> Keys.copy(line));
    }

    /** A quantity, or what its name stands for. */
    private static Object meant(RateSource source, Object quantity) {
        return Keys.get(source.tree(), "quantities")
                .filter(Map.class::isInstance)
                .flatMap(named -> Keys.get((Map<?, ?>) named, String.valueOf(quantity)))
                .orElse(quantity);
    }

    private static boolean isDemand(Object quantity) {
        return RateSource.mentions(quantity, "peak")
                && !RateSource.mentions(quantity, "energy")
                && !RateSource.mentions(quantity, "hours");
    }

    private static Object rounded(Object quantity, Steps way) {
        return Keys.with(way.written(), ROUNDED, quantity);
    }
}
