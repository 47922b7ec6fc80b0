// SPDX-License-Identifier: Apache-2.0
package tariff.service.request;

import java.math.BigDecimal;
import java.util.Optional;
import tariff.rate.clause.Written;

/**
 * Where a number may lie.
 *
 * @param least the least of it
 * @param itself whether the least itself is allowed
 * @param most the most of it, allowed
 * @param unit of both, may be empty
 */
record Range(BigDecimal least, boolean itself, BigDecimal most, String unit) {

    static Range from(String least, String most, String unit) {
        return new Range(new BigDecimal(least), true, new BigDecimal(most), unit);
    }

    static Range above(String least, String most, String unit) {
        return new Range(new BigDecimal(least), false, new BigDecimal(most), unit);
    }

    /** The number that stands there; the most where what stands there is reported. */
    BigDecimal of(Written in) {
        BigDecimal number = in.number();
        if (!in.isNumber()) {
            return most;
        }
        int beside = number.compareTo(least);
        if (itself ? beside >= 0 : beside > 0) {
            if (number.compareTo(most) <= 0) {
                return number;
            }
        }
        in.wrong("range", "is out of range", words());
        return most;
    }

    /** The number under a key, which may be absent. */
    Optional<BigDecimal> optional(Written in, String key) {
        return in.has(key) ? Optional.of(of(in.at(key))) : Optional.empty();
    }

    /** The number under a key; that it is absent is reported. */
    BigDecimal required(Written in, String key) {
        if (!in.has(key)) {
            in.number(key);
            return most;
        }
        return of(in.at(key));
    }

    private String words() {
        String range = itself
                ? least.toPlainString() + " to " + most.toPlainString()
                : "above " + least.toPlainString() + ", at most " + most.toPlainString();
        return unit.isEmpty() ? range : range + " " + unit;
    }
}
