// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.util.List;
import java.util.Optional;
import tariff.correction.CapacitorBank;
import tariff.electrical.BankAtSite;
import tariff.electrical.Screening;
import tariff.payback.Investment;
import tariff.payback.Outlook;

/**
 * What is offered.
 *
 * @param bank the capacitors
 * @param investment what it costs; empty if no price is known, and then nothing is said of payback
 * @param outlook what is expected of the years ahead
 * @param atSite the bank at its place, to be screened; empty if nothing is known of the place
 */
public record Proposal(
        CapacitorBank bank, Optional<Investment> investment, Outlook outlook, Optional<BankAtSite> atSite) {

    /** A bank at a site of which nothing is known. */
    public Proposal(CapacitorBank bank, Optional<Investment> investment, Outlook outlook) {
        this(bank, investment, outlook, Optional.empty());
    }

    /** A bank without a price. */
    public static Proposal of(CapacitorBank bank) {
        return new Proposal(bank, Optional.empty(), Outlook.level(Optional.empty()));
    }

    /** What the screens make of the bank at its place; none if nothing is known of the place. */
    public List<Screening> screens() {
        return atSite.map(BankAtSite::screens).orElse(List.of());
    }
}
