// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.util.Optional;
import tariff.meter.Register;

/** What a column holds. */
sealed interface Meaning {
    /** A register, of the whole period or of one of the rate's windows. */
    record Reading(Register register, Optional<String> window) implements Meaning {}

    /** The amount of the bill. */
    record Total() implements Meaning {}

    /** The amount charged for one of the rate's lines. */
    record Line(String name) implements Meaning {}

    /** Something that says which days were billed, or when the bill was written. */
    record Date(When when) implements Meaning {}

    /** Whether a reading was estimated. */
    record Estimated() implements Meaning {}

    /** Nothing that is used here. */
    record Ignored(String reason) implements Meaning {}

    /** Which date. */
    enum When {
        MONTH,
        YEAR,
        FROM,
        TO,
        STATEMENT
    }

    default boolean isUsed() {
        return !(this instanceof Ignored);
    }

    default boolean isNumber() {
        return this instanceof Reading || this instanceof Total || this instanceof Line;
    }

    default boolean isPowerFactor() {
        return this instanceof Reading reading && reading.register() == Register.POWER_FACTOR;
    }
}
