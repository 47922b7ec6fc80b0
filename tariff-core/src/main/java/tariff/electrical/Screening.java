// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import java.util.OptionalDouble;

/**
 * The answer of one screen. An estimate that tells where to look; never a design.
 *
 * @param name the screen's, in trade words
 * @param verdict what it makes of the bank
 * @param found the figure found, with its unit, in a sentence; {@code needs …} where data are missing
 * @param value the same figure as a number, absent where there is none
 * @param unit of the value, such as {@code kVA} or {@code %}
 * @param limit what the figure is held against, with its unit
 * @param source where the limit is written down, with the edition, or {@code common practice, no source}
 * @param settledBy what would settle the question
 */
public record Screening(
        String name,
        Verdict verdict,
        String found,
        OptionalDouble value,
        String unit,
        String limit,
        String source,
        String settledBy) {

    /** Refuses a blank text, and a value that is not a number, with an {@link IllegalArgumentException}. */
    public Screening {
        for (String text : new String[] {name, found, unit, limit, source, settledBy}) {
            if (text.isBlank()) {
                throw new IllegalArgumentException("a screening needs every text; given: " + found);
            }
        }
        if (value.isPresent() && Double.isNaN(value.getAsDouble())) {
            throw new IllegalArgumentException(name + ": value was NaN; allowed: a number, or none");
        }
    }
}
