// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.Map;
import java.util.stream.Stream;
import tariff.meter.MeteredMonth;

/** The readings of the period before were billed once more. */
record ReadingsOfTheMonthBefore() implements Cause {

    @Override
    public String code() {
        return "readings-of-the-month-before";
    }

    @Override
    public Stream<Trial> trials(Case bills) {
        return bills.open().stream().filter(place -> place > 0).map(place -> {
            MeteredMonth before = bills.months().get(place - 1);
            return bills.read(
                    this,
                    "the readings of " + before.period(),
                    Map.of(
                            place,
                            bills.months().get(place).with(before.totals()).withWindows(before.windows())));
        });
    }
}
