// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.util.Optional;

/**
 * What every line has.
 *
 * @param name as the bill prints it
 * @param clause the words of the printed rate sheet, to read beside the line's own
 * @param when the line applies only if this holds
 * @param round the line's own rounding, in place of the rate's
 * @param shownOnly the amount is worked out for other lines but is not part of the total
 */
public record Heading(
        String name, Optional<String> clause, Optional<Condition> when, Optional<Rounding> round, boolean shownOnly) {

    static Heading read(Written in) {
        return new Heading(
                in.text("name"),
                in.optionalText("clause"),
                in.has("when") ? Optional.of(Condition.read(in, "when")) : Optional.empty(),
                Rounding.readOptional(in, "round"),
                in.flag("shownOnly"));
    }
}
