// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.stream.Stream;

/** A broken point of power factor counts otherwise than the rate says. */
record PointCount() implements Cause {
    private static final String EXACT = "exact";

    @Override
    public String code() {
        return "point-count";
    }

    @Override
    public Stream<Trial> trials(Case bills) {
        Map<String, String> ways = new LinkedHashMap<>();
        ways.put(EXACT, "counted in proportion");
        ways.put("started", "counted as whole ones");
        ways.put("completed", "not counted");
        ways.put("majorFraction", "counted as whole ones above a half");
        return ways.entrySet().stream()
                .flatMap(way -> bills.rewritten(
                        this, "broken points of power factor " + way.getValue(), value -> with(value, way.getKey())));
    }

    private static Object with(Object value, String way) {
        if (!(value instanceof Map<?, ?> map)
                || !map.containsKey("slopes")
                || way.equals(map.containsKey("points") ? map.get("points") : EXACT)) {
            return value;
        }
        return Keys.with(map, "points", way);
    }
}
