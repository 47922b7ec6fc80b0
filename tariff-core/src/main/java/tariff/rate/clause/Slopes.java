// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;

/**
 * So much for each point (0.01) of power factor below or above an edge: {@code "slopes": [ { "below": 0.85, "perPoint": 1.5 }, { "below":
 * 0.75, "perPoint": 3 } ]}. Each slope holds until the next one's edge. {@code "points"} says how a broken point counts.
 *
 * @param below slopes downward, the highest edge first
 * @param above slopes upward, the lowest edge first
 */
record Slopes(String powerFactor, List<Slope> below, List<Slope> above, Points points, Limits limits)
        implements Schedule {

    /** From an edge on, so much for each point. */
    record Slope(BigDecimal edge, BigDecimal perPoint) {}

    /** How a broken point counts. */
    enum Points {
        EXACT("exact", "each 0.01 (parts in proportion)"),
        STARTED("started", "each 0.01 or part of it"),
        COMPLETED("completed", "each full 0.01"),
        MAJOR_FRACTION("majorFraction", "each 0.01, or more than half of it,");

        private final String key;
        private final String words;

        Points(String key, String words) {
            this.key = key;
            this.words = words;
        }

        BigDecimal count(BigDecimal distance) {
            BigDecimal points = distance.movePointRight(2);
            return switch (this) {
                case EXACT -> points;
                case STARTED -> points.setScale(0, RoundingMode.CEILING);
                case COMPLETED -> points.setScale(0, RoundingMode.FLOOR);
                case MAJOR_FRACTION -> points.setScale(0, RoundingMode.HALF_DOWN);
            };
        }
    }

    private static final Map<String, Points> POINTS = new LinkedHashMap<>();

    static {
        for (Points points : Points.values()) {
            POINTS.put(points.key, points);
        }
    }

    static Slopes read(Written in, String powerFactor, Limits limits) {
        List<Slope> below = new ArrayList<>();
        List<Slope> above = new ArrayList<>();
        for (Written each : in.list("slopes")) {
            BigDecimal perPoint = each.number("perPoint");
            if (each.has("above") == each.has("below")) {
                each.wrong("slope", "must say either \"below\" or \"above\"", "{ \"below\": 0.90, \"perPoint\": 1 }");
            } else if (each.has("below")) {
                below.add(new Slope(Schedule.edge(each, "below"), perPoint));
            } else {
                above.add(new Slope(Schedule.edge(each, "above"), perPoint));
            }
            each.refuseOtherKeys();
        }
        below.sort(Comparator.comparing(Slope::edge).reversed());
        above.sort(Comparator.comparing(Slope::edge));
        return new Slopes(
                powerFactor, List.copyOf(below), List.copyOf(above), in.word("points", POINTS, Points.EXACT), limits);
    }

    @Override
    public void checkKind(Scope scope) {
        twice(below, "below", scope);
        twice(above, "above", scope);
        if (!below.isEmpty()
                && !above.isEmpty()
                && above.get(0).edge().compareTo(below.get(0).edge()) < 0) {
            scope.at("slopes")
                    .error(
                            "slopes",
                            "overlap: one counts below "
                                    + Decimals.plain(below.get(0).edge()) + ", another above "
                                    + Decimals.plain(above.get(0).edge()));
        }
    }

    private static void twice(List<Slope> slopes, String side, Scope scope) {
        for (int i = 1; i < slopes.size(); i++) {
            if (slopes.get(i).edge().compareTo(slopes.get(i - 1).edge()) == 0) {
                scope.at("slopes").error("slopes", "has two slopes " + side + " " + edge(slopes.get(i)));
            }
        }
    }

    @Override
    public BigDecimal plain(BigDecimal pf) {
        BigDecimal value = BigDecimal.ZERO;
        for (int i = 0; i < below.size() && pf.compareTo(below.get(i).edge()) < 0; i++) {
            Slope slope = below.get(i);
            BigDecimal end = i + 1 < below.size() ? pf.max(below.get(i + 1).edge()) : pf;
            value = value.add(
                    slope.perPoint().multiply(points.count(slope.edge().subtract(end))));
        }
        for (int i = 0; i < above.size() && pf.compareTo(above.get(i).edge()) > 0; i++) {
            Slope slope = above.get(i);
            BigDecimal end = i + 1 < above.size() ? pf.min(above.get(i + 1).edge()) : pf;
            value = value.add(slope.perPoint().multiply(points.count(end.subtract(slope.edge()))));
        }
        return value;
    }

    @Override
    public Optional<BigDecimal> target() {
        return below.stream()
                .filter(slope -> slope.perPoint().signum() > 0)
                .map(Slope::edge)
                .findFirst();
    }

    @Override
    public List<BigDecimal> edges() {
        return Stream.concat(below.stream(), above.stream())
                .map(Slope::edge)
                .sorted()
                .distinct()
                .toList();
    }

    @Override
    public String words(String unit) {
        List<String> phrases = new ArrayList<>();
        List<String> upward = new ArrayList<>();
        for (int i = 0; i < below.size(); i++) {
            phrases.add(phrase(
                    below.get(i), "below", i + 1 < below.size() ? " down to " + edge(below.get(i + 1)) : "", unit));
        }
        for (int i = 0; i < above.size(); i++) {
            upward.add(phrase(
                    above.get(i), "above", i + 1 < above.size() ? " up to " + edge(above.get(i + 1)) : "", unit));
        }
        return String.join(", then ", phrases)
                + (phrases.isEmpty() || upward.isEmpty() ? "" : ", and ")
                + String.join(", then ", upward)
                + limits.words(unit);
    }

    private String phrase(Slope slope, String side, String until, String unit) {
        return Decimals.plain(slope.perPoint()) + " " + unit + " for " + points.words + " that the " + powerFactor
                + " power factor is " + side + " " + edge(slope) + until;
    }

    private static String edge(Slope slope) {
        return Decimals.plain(slope.edge());
    }
}
