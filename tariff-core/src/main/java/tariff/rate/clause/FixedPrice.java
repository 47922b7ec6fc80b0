// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.Optional;
import tariff.meter.Unit;

/** A number for each unit; negative for a credit. */
record FixedPrice(BigDecimal each) implements Price {

    @Override
    public void check(Scope scope, Optional<Unit> unit) {}

    @Override
    public Figure charge(Figure quantity, Facts facts) {
        return Figure.of(quantity.value().multiply(each), Unit.MONEY, "{} × {}", quantity, Figure.number(each));
    }

    @Override
    public String words(String unit) {
        return Decimals.plain(each) + " per " + unit;
    }

    @Override
    public boolean isFree() {
        return each.signum() == 0;
    }
}
