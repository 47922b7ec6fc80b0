// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.util.Optional;
import tariff.correction.CapacitorBank;
import tariff.payback.Investment;
import tariff.payback.Outlook;

/**
 * What is offered.
 *
 * @param bank the capacitors
 * @param investment what it costs; empty if no price is known, and then nothing is said of payback
 * @param outlook what is expected of the years ahead
 */
public record Proposal(CapacitorBank bank, Optional<Investment> investment, Outlook outlook) {

    /** A bank without a price. */
    public static Proposal of(CapacitorBank bank) {
        return new Proposal(bank, Optional.empty(), Outlook.level(Optional.empty()));
    }
}
