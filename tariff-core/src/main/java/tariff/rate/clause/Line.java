// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.util.List;
import java.util.Optional;
import java.util.Set;

/** A line of a bill: quantity × price, a percentage of other lines, or a floor or cap under a group of lines. */
public sealed interface Line extends Clause permits Charge, Percentage, Bound {

    Heading heading();

    /** Reports what is wrong; the scope holds the lines above. */
    void check(Scope scope);

    /** The money before the line's rounding, whether or not its condition holds. */
    Figure amount(Facts facts);

    /** What it says, without its name and condition. */
    String words(Scope scope);

    /**
     * Why the line asks nothing in any month; empty if it may ask something.
     *
     * @param nothing the lines above that ask nothing
     */
    Optional<String> asksNothing(Set<String> nothing);

    default String name() {
        return heading().name();
    }

    /** Reads a line; {@code above} are the lines before it that count towards the total. */
    static Line read(Written in, List<String> above) {
        Heading heading = Heading.read(in);
        Line line;
        if (in.has("percentOf")) {
            line = Percentage.read(in, heading, above);
        } else if (in.has("atLeast") || in.has("atMost")) {
            line = Bound.read(in, heading, above);
        } else if (in.has("quantity")) {
            line = Charge.read(in, heading);
        } else {
            in.wrong(
                    "line",
                    "is not a line of a bill",
                    "\"quantity\" with \"price\" or \"blocks\"; \"percentOf\" with \"percent\" or \"schedule\"; \"atLeast\" or"
                            + " \"atMost\" with \"of\"");
            return new Charge(heading, Quantity.unreadable(), new FixedPrice(java.math.BigDecimal.ONE));
        }
        in.refuseOtherKeys();
        return line;
    }
}
