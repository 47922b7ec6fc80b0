// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import java.util.OptionalDouble;

/**
 * A motor that may carry a capacitor on its terminals.
 *
 * @param name as the site calls it
 * @param volts rated, between lines [V], above 0
 * @param noLoadAmps current at no load [A], above 0, if known
 * @param kvarAtTerminals what is switched with the motor [kvar], 0 if nothing
 */
public record Motor(String name, double volts, OptionalDouble noLoadAmps, double kvarAtTerminals) {

    /** Refuses figures outside their ranges with an {@link IllegalArgumentException}. */
    public Motor {
        Given.positive("volts", volts, "V");
        noLoadAmps.ifPresent(amps -> Given.positive("noLoadAmps", amps, "A"));
        Given.notNegative("kvarAtTerminals", kvarAtTerminals, "kvar");
    }
}
