// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import tariff.meter.Unit;

/** A price that depends on a power factor: {@code { "bySchedule": { "powerFactor": "billing", "bands": [ … ] } }}. */
record SchedulePrice(Schedule schedule) implements Price {

    @Override
    public void check(Scope scope, Optional<Unit> unit) {
        schedule.check(scope.at("bySchedule"));
    }

    @Override
    public Figure charge(Figure quantity, Facts facts) {
        return schedule.value(facts)
                .map(price ->
                        Figure.of(quantity.value().multiply(price.value()), Unit.MONEY, "{} × {}", quantity, price))
                .orElseGet(() -> Figure.of(BigDecimal.ZERO, Unit.MONEY, "{}, no power factor", quantity));
    }

    @Override
    public String words(String unit) {
        return schedule.words("per " + unit);
    }

    @Override
    public boolean isFree() {
        return false;
    }

    @Override
    public List<Clause> parts() {
        return List.of(schedule);
    }
}
