// SPDX-License-Identifier: Apache-2.0
package tariff.service.request;

import java.math.BigDecimal;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Stream;
import tariff.notice.Finding;

/** The values of a query as a JSON document would hold them: lists, decimals, texts, windows, true and false. */
record QueryValues(List<Finding> findings) {
    private static final Set<String> TEXTS = Set.of("rate", "zone", "stamps", "dates", "gaps", "site");
    private static final Set<String> REPEATED = Set.of("option", "agreed");
    private static final Set<String> FLAGS = Set.of("slidingDemand", "charts", "counter");
    private static final Set<String> EITHER = Set.of("true", "false");
    private static final String STEPS = "stepsKvar";
    private static final String OFF = "off";
    private static final String NUMBER = "[+-]?(\\d{1,40}(\\.\\d{0,40})?|\\.\\d{1,40})([eE][+-]?\\d{1,3})?";

    Map<String, Object> of(Map<String, List<String>> parameters) {
        Map<String, Object> values = new TreeMap<>();
        parameters.forEach((name, given) -> {
            if (REPEATED.contains(name)) {
                values.put(name, List.copyOf(given));
            } else if (given.size() > 1) {
                findings.add(Finding.error("repeated", "/" + name, "is given more than once")
                        .found(given.size() + " times")
                        .allowed("once"));
                put(values, name, given.get(0));
            } else {
                put(values, name, given.isEmpty() ? "" : given.get(0));
            }
        });
        return values;
    }

    private void put(Map<String, Object> values, String name, String text) {
        if (name.equals(OFF)) {
            OffHours.document("/" + name, text, findings::add).ifPresent(window -> values.put(name, window));
        } else {
            values.put(name, value(name, text));
        }
    }

    private static Object value(String name, String text) {
        if (name.equals(STEPS)) {
            return Stream.of(text.split(",", -1)).map(QueryValues::number).toList();
        }
        if (FLAGS.contains(name)) {
            return EITHER.contains(text) ? (Object) Boolean.valueOf(text) : text;
        }
        return TEXTS.contains(name) || IntervalTerms.columnNames().contains(name) ? text : number(text);
    }

    /** What is no number stays a text, to be refused where a number is asked for. */
    private static Object number(String text) {
        return text.matches(NUMBER) ? new BigDecimal(text) : text;
    }
}
