// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.Optional;

/**
 * What every schedule may have: a floor, a cap, and a rounding of the value. The value is rounded first, then held within floor and
 * cap.
 */
record Limits(Optional<BigDecimal> atLeast, Optional<BigDecimal> atMost, Optional<Rounding> round) {

    static Limits none() {
        return new Limits(Optional.empty(), Optional.empty(), Optional.empty());
    }

    static Limits read(Written in) {
        return new Limits(
                in.optionalNumber("atLeast"), in.optionalNumber("atMost"), Rounding.readOptional(in, "round"));
    }

    void check(Scope scope) {
        if (atLeast.isPresent() && atMost.isPresent() && atLeast.get().compareTo(atMost.get()) > 0) {
            scope.at("atLeast")
                    .error(
                            "limits",
                            "is above \"atMost\"",
                            Decimals.plain(atLeast.get()),
                            "at most " + Decimals.plain(atMost.get()));
        }
    }

    BigDecimal apply(BigDecimal value) {
        BigDecimal held = round.isPresent() ? round.get().apply(value) : value;
        if (atLeast.isPresent()) {
            held = held.max(atLeast.get());
        }
        return atMost.isPresent() ? held.min(atMost.get()) : held;
    }

    String words(String unit) {
        return round.map(rounding -> ", " + rounding.words()).orElse("")
                + atLeast.map(floor -> ", at least " + Decimals.plain(floor) + " " + unit)
                        .orElse("")
                + atMost.map(cap -> ", at most " + Decimals.plain(cap) + " " + unit)
                        .orElse("");
    }
}
