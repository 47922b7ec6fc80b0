// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.math.BigDecimal;
import java.util.Collections;
import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;

/**
 * What the registers gave, for a whole period or for one window of it. A register that was not read is absent, which is not
 * the same as zero.
 *
 * @param values never negative; the power factor in (0, 1]
 */
public record Readings(Map<Register, BigDecimal> values) {
    private static final Readings NONE = new Readings(Map.of());

    /** @throws IllegalArgumentException naming the first register that is negative, or a power factor outside (0, 1] */
    public Readings {
        EnumMap<Register, BigDecimal> copy = new EnumMap<>(Register.class);
        copy.putAll(values);
        copy.forEach(Readings::check);
        values = Collections.unmodifiableMap(copy);
    }

    public static Readings none() {
        return NONE;
    }

    public Optional<BigDecimal> get(Register register) {
        return Optional.ofNullable(values.get(register));
    }

    public boolean has(Register register) {
        return values.containsKey(register);
    }

    public Readings with(Register register, BigDecimal value) {
        EnumMap<Register, BigDecimal> copy = new EnumMap<>(Register.class);
        copy.putAll(values);
        copy.put(register, value);
        return new Readings(copy);
    }

    /** For figures written in code; {@code value} is read as a decimal, so that {@code "0.1"} is exactly a tenth. */
    public Readings with(Register register, String value) {
        return with(register, new BigDecimal(value));
    }

    public Readings with(Register register, long value) {
        return with(register, BigDecimal.valueOf(value));
    }

    public Readings without(Register register) {
        EnumMap<Register, BigDecimal> copy = new EnumMap<>(Register.class);
        copy.putAll(values);
        copy.remove(register);
        return new Readings(copy);
    }

    private static void check(Register register, BigDecimal value) {
        if (value.signum() < 0) {
            throw new IllegalArgumentException(
                    register.key() + " is " + value.toPlainString() + "; it cannot be below zero");
        }
        if (register == Register.POWER_FACTOR && (value.signum() == 0 || value.compareTo(BigDecimal.ONE) > 0)) {
            throw new IllegalArgumentException(
                    register.key() + " is " + value.toPlainString() + "; it must be above 0 and at most 1");
        }
    }
}
