// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.Map;
import java.util.Optional;
import tariff.meter.Unit;

/** The days billed: {@code { "days": "period" }}. */
record Days() implements Quantity {

    static Quantity read(Written in) {
        return in.requiredWord("days", Map.of("period", new Days()), new Days());
    }

    @Override
    public Optional<Unit> unit(Scope scope) {
        return Optional.of(Unit.DAYS);
    }

    @Override
    public Figure value(Facts facts) {
        return Figure.given(BigDecimal.valueOf(facts.period().days()), Unit.DAYS, "days billed");
    }

    @Override
    public String words() {
        return "the days billed";
    }
}
