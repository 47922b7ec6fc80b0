// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * One value for each band of power factor, from the lowest band up: {@code "bands": [ { "below": 0.75, "value": 20 }, { "upTo": 0.85,
 * "value": 10 }, { "value": 0 } ]}. {@code below} leaves its edge to the next band, {@code upTo} keeps it. The last band is open.
 */
record Bands(String powerFactor, List<Band> bands, Limits limits) implements Schedule {

    /**
     * A band of power factor.
     *
     * @param edge its upper end; empty for the last
     * @param holdsEdge whether the edge itself belongs to it
     */
    record Band(Optional<BigDecimal> edge, boolean holdsEdge, BigDecimal value) {

        boolean holds(BigDecimal pf) {
            return edge.map(end -> holdsEdge ? pf.compareTo(end) <= 0 : pf.compareTo(end) < 0)
                    .orElse(true);
        }
    }

    static Bands read(Written in, String powerFactor, Limits limits) {
        List<Band> bands = new ArrayList<>();
        for (Written each : in.list("bands")) {
            Optional<BigDecimal> below = edge(each, "below");
            Optional<BigDecimal> upTo = edge(each, "upTo");
            if (below.isPresent() && upTo.isPresent()) {
                each.wrong("band", "says both \"below\" and \"upTo\"", "one of the two");
            }
            bands.add(new Band(below.or(() -> upTo), below.isEmpty(), each.number("value")));
            each.refuseOtherKeys();
        }
        return new Bands(powerFactor, List.copyOf(bands), limits);
    }

    private static Optional<BigDecimal> edge(Written in, String key) {
        return in.has(key) ? Optional.of(Schedule.edge(in, key)) : Optional.empty();
    }

    @Override
    public void checkKind(Scope scope) {
        for (int i = 0; i < bands.size(); i++) {
            Scope here = scope.at("bands").at(i);
            boolean last = i == bands.size() - 1;
            Optional<BigDecimal> edge = bands.get(i).edge();
            if (edge.isEmpty() != last) {
                here.error(
                        "bands",
                        last
                                ? "is the last band, so it must be open: a power factor above "
                                        + edge.map(Decimals::plain).orElse("") + " has no value"
                                : "has no edge; only the last band may be open");
            } else if (i > 0
                    && !last
                    && edge.get().compareTo(bands.get(i - 1).edge().orElse(BigDecimal.ZERO)) <= 0) {
                here.error(
                        "bands",
                        "must end above the band before it",
                        Decimals.plain(edge.get()),
                        "more than " + Decimals.plain(bands.get(i - 1).edge().orElse(BigDecimal.ZERO)));
            }
        }
    }

    @Override
    public BigDecimal plain(BigDecimal pf) {
        return bands.stream()
                .filter(band -> band.holds(pf))
                .findFirst()
                .map(Band::value)
                .orElse(BigDecimal.ZERO);
    }

    @Override
    public Optional<BigDecimal> target() {
        for (int i = bands.size() - 1; i >= 0; i--) {
            if (bands.get(i).value().signum() > 0) {
                return bands.get(i).edge();
            }
        }
        return Optional.empty();
    }

    @Override
    public List<BigDecimal> edges() {
        return bands.stream().map(Band::edge).flatMap(Optional::stream).toList();
    }

    @Override
    public String words(String unit) {
        List<String> phrases = new ArrayList<>();
        for (Band band : bands) {
            String value = Decimals.plain(band.value()) + " " + unit;
            String where = phrases.isEmpty() ? " where the " + powerFactor + " power factor is" : "";
            phrases.add(band.edge()
                    .map(end -> value + where + (band.holdsEdge() ? " at most " : " below ") + Decimals.plain(end))
                    .orElse(phrases.isEmpty() ? value : "else " + value));
        }
        return String.join(", ", phrases) + limits.words(unit);
    }
}
