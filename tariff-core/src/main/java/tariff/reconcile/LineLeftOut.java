// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import tariff.rate.RateSource;

/** A line of the rate was not charged: a tax, a minimum, a surcharge. */
record LineLeftOut() implements Cause {
    private static final List<String> GROUPS = List.of("percentOf", "of", "amount");

    @Override
    public String code() {
        return "line-left-out";
    }

    @Override
    public boolean mayBeOfSingleMonths() {
        return true;
    }

    @Override
    public Stream<Trial> trials(Case bills) {
        if (bills.rate().lines().size() < 2) {
            return Stream.empty();
        }
        return bills.rate().lines().stream()
                .flatMap(line -> bills.written(
                        this, "the line \"" + line.name() + "\" left out", without(bills.source(), line.name())));
    }

    private static RateSource without(RateSource source, String line) {
        if (!(source.tree().get("lines") instanceof List<?> lines)) {
            return source;
        }
        List<Object> left = lines.stream()
                .map(Object.class::cast)
                .filter(each -> !(each instanceof Map<?, ?> map && line.equals(map.get("name"))))
                .toList();
        return source.with("lines", left)
                .rewritten(value -> value instanceof Map<?, ?> map ? unnamed(map, line) : value);
    }

    /** The object without the line in its groups of lines. */
    private static Map<String, Object> unnamed(Map<?, ?> map, String line) {
        Map<String, Object> changed = new LinkedHashMap<>();
        map.forEach((key, value) -> {
            boolean group = GROUPS.contains(String.valueOf(key)) && value instanceof List<?>;
            changed.put(
                    String.valueOf(key),
                    group && value instanceof List<?> names
                            ? names.stream()
                                    .map(Object.class::cast)
                                    .filter(name -> !line.equals(name))
                                    .toList()
                            : value);
        });
        return changed;
    }
}
