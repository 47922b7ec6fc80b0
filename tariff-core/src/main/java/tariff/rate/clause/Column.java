// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.Arrays;
import java.util.Optional;
import java.util.function.LongBinaryOperator;
import tariff.meter.Unit;

/**
 * A quantity of each hour, day … of a period as whole multiples of 10<sup>−scale</sup>. Everything is exact: what would not fit a long
 * ends in an {@link ArithmeticException}, and the decimals do the work instead.
 */
@SuppressWarnings("ArrayRecordComponent") // lives for one question and is never compared
record Column(Unit unit, int scale, long[] values) {

    static Optional<Column> constant(BigDecimal value, Unit unit, int size) {
        long[] values = new long[size];
        BigDecimal plain = value.scale() < 0 ? value.setScale(0) : value;
        Arrays.fill(values, plain.unscaledValue().longValueExact());
        return Optional.of(new Column(unit, plain.scale(), values));
    }

    Column times(BigDecimal factor) {
        BigDecimal plain = factor.scale() < 0 ? factor.setScale(0) : factor;
        long whole = plain.unscaledValue().longValueExact();
        long[] products = new long[values.length];
        for (int i = 0; i < products.length; i++) {
            products[i] = Math.multiplyExact(values[i], whole);
        }
        return new Column(unit, scale + plain.scale(), products);
    }

    /** Both columns brought to the finer scale and combined place by place. */
    Column with(Column other, LongBinaryOperator combine) {
        int finer = Math.max(scale, other.scale);
        long[] mine = at(finer).values;
        long[] theirs = other.at(finer).values;
        long[] combined = new long[values.length];
        for (int i = 0; i < combined.length; i++) {
            combined[i] = combine.applyAsLong(mine[i], theirs[i]);
        }
        return new Column(unit, finer, combined);
    }

    private Column at(int finer) {
        return finer == scale ? this : new Column(unit, finer, times(BigDecimal.TEN.pow(finer - scale)).values);
    }

    Column in(Unit other) {
        return new Column(other, scale, values);
    }

    BigDecimal sum() {
        long sum = 0;
        for (long value : values) {
            sum = Math.addExact(sum, value);
        }
        return BigDecimal.valueOf(sum, scale);
    }
}
