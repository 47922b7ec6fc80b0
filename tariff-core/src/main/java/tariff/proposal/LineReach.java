// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;

/**
 * Where a line of the bill stops paying for more kvar.
 *
 * @param line the line's name
 * @param saves the most it saves in a settled year, zero for a line that only costs
 * @param fromKvar the size that saves all of it but a hundredth; for a line that only costs, from which on it does
 */
public record LineReach(String line, BigDecimal saves, BigDecimal fromKvar) {

    /** {@code Reactive energy: saves up to 1200.00 a year, 99 % of it from 140 kvar on}. */
    public String words() {
        String kvar = fromKvar.stripTrailingZeros().toPlainString();
        return saves.signum() > 0
                ? line + ": saves up to " + saves.toPlainString() + " a year, 99 % of it from " + kvar + " kvar on"
                : line + ": costs more from " + kvar + " kvar on";
    }
}
