// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.stream.Stream;

/** Another day decides the season than the rate says. */
record SeasonChoice() implements Cause {
    private static final String KEY = "seasonBy";
    private static final String DAYS = "days";

    @Override
    public String code() {
        return "season-choice";
    }

    @Override
    public Stream<Trial> trials(Case bills) {
        if (!bills.source().mentions("seasons")) {
            return Stream.empty();
        }
        Map<String, String> ways = new LinkedHashMap<>();
        ways.put(DAYS, "by the days of the period");
        ways.put("firstDay", "by the first day billed");
        ways.put("lastDay", "by the last day billed");
        ways.put("statementDate", "by the date of the statement");
        Object asItIs = bills.source().tree().getOrDefault(KEY, DAYS);
        return ways.entrySet().stream()
                .filter(way -> !way.getKey().equals(asItIs))
                .flatMap(way -> bills.written(
                        this,
                        "the season told " + way.getValue(),
                        bills.source().with(KEY, way.getKey())));
    }
}
