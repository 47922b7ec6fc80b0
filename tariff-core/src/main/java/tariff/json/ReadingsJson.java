// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import java.math.BigDecimal;
import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import tariff.meter.Readings;
import tariff.meter.Register;
import tariff.rate.clause.Written;

/** Registers by their keys, in the object that they stand in. */
final class ReadingsJson {
    private ReadingsJson() {}

    static Readings read(Written in) {
        Map<Register, BigDecimal> values = new EnumMap<>(Register.class);
        for (Register register : Register.values()) {
            Optional<BigDecimal> number = in.optionalNumber(register.key());
            number.filter(value -> holds(in.at(register.key()), register, value))
                    .ifPresent(value -> values.put(register, value));
        }
        return new Readings(values);
    }

    private static boolean holds(Written in, Register register, BigDecimal value) {
        boolean holds = register == Register.POWER_FACTOR
                ? value.signum() > 0 && value.compareTo(BigDecimal.ONE) <= 0
                : value.signum() >= 0;
        if (!holds) {
            in.wrong(
                    "reading",
                    "cannot be a reading of " + register.words(),
                    register == Register.POWER_FACTOR ? "above 0, at most 1" : "0 or more");
        }
        return holds;
    }

    static JsonObject write(JsonObject json, Readings readings) {
        readings.values().forEach((register, value) -> json.with(register.key(), value));
        return json;
    }
}
