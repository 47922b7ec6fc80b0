// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

/** The rate bills something that the month does not give; the message names both. */
public final class MissingReading extends RuntimeException {

    /** @param message such as {@code the rate bills kvarh in window "day"; the bill gives only the month's total} */
    public MissingReading(String message) {
        super(message);
    }
}
