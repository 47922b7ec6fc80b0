// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import java.math.BigDecimal;
import java.util.List;
import tariff.correction.YearInService;
import tariff.meter.Readings;
import tariff.meter.Register;

/** What a bank did through the months of interval data. */
final class YearInServiceJson {
    private static final List<Register> SHOWN =
            List.of(Register.LAGGING_KVARH, Register.LEADING_KVARH, Register.PEAK_KVA);

    private YearInServiceJson() {}

    static JsonObject write(YearInService year) {
        JsonObject json = new JsonObject().with("leadingKvarhCreated", year.leadingKvarhCreated());
        year.steps()
                .ifPresent(walk -> json.with("operations", year.operations())
                        .withNumbers(
                                "stepOperations",
                                walk.operations().stream()
                                        .map(BigDecimal::valueOf)
                                        .toList())
                        .with("hoursAtFullOutput", walk.hoursAtFullOutput()));
        return json.withAll(
                "months",
                year.months(),
                month -> PeriodJson.write(new JsonObject(), month.period())
                        .with("before", registers(month.before()))
                        .with("after", registers(month.after())));
    }

    private static JsonObject registers(Readings readings) {
        JsonObject json = new JsonObject();
        SHOWN.forEach(register -> json.withIf(register.key(), readings.get(register)));
        return json;
    }
}
