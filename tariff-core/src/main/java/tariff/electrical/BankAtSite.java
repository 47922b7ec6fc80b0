// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import java.util.List;

/**
 * A bank and the site where it would stand: what screens are asked about.
 *
 * @param site what is known of it
 * @param bank by its nameplate
 */
public record BankAtSite(SiteData site, BankData bank) {

    /** The answer of every screen; see {@link Screens#all}. */
    public List<Screening> screens() {
        return Screens.all(site, bank);
    }

    /** The answers that decide whether the bank may do without reactors. */
    public List<Screening> harmonicScreens() {
        return Screens.harmonics(site, bank);
    }
}
