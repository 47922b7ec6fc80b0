// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.stream.Stream;
import tariff.meter.MeteredMonth;
import tariff.meter.Register;

/** Leading kvarh do something else to the power factor than the rate says. */
record LeadingKvarh() implements Cause {
    private static final String KEY = "leading";
    private static final String IGNORED = "ignored";

    @Override
    public String code() {
        return "leading-kvarh";
    }

    @Override
    public Stream<Trial> trials(Case bills) {
        if (!bills.anyMonth(LeadingKvarh::sendsBack)) {
            return Stream.empty();
        }
        Map<String, String> ways = new LinkedHashMap<>();
        ways.put(IGNORED, "left out of the power factor");
        ways.put("added", "added to lagging in the power factor");
        ways.put("netted", "taken from lagging in the power factor");
        ways.put("larger", "in the power factor where they are the larger");
        return ways.entrySet().stream()
                .flatMap(way -> bills.written(
                        this,
                        "leading kvarh " + way.getValue(),
                        PowerFactors.changed(bills.source(), rule -> with(rule, way.getKey()))));
    }

    private static boolean sendsBack(MeteredMonth month) {
        return month.totals()
                .get(Register.LEADING_KVARH)
                .filter(kvarh -> kvarh.signum() > 0)
                .isPresent();
    }

    private static Map<?, ?> with(Map<?, ?> rule, String way) {
        return way.equals(rule.containsKey(KEY) ? rule.get(KEY) : IGNORED) ? rule : Keys.with(rule, KEY, way);
    }
}
