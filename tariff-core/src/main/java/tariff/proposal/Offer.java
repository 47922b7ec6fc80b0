// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import tariff.electrical.KwhShare;

/**
 * An offer as the customer received it.
 *
 * @param proposal bank, price and outlook
 * @param place where the bank would stand, if the offer says
 * @param nonLinearShare part of the load that is drives, rectifiers and the like, 0 to 1, if known
 * @param currentThd harmonic over fundamental current at the bank's place without it, 0 or more, if measured
 * @param claims what it promises
 */
public record Offer(
        Proposal proposal,
        Optional<KwhShare.Place> place,
        Optional<BigDecimal> nonLinearShare,
        Optional<BigDecimal> currentThd,
        List<Claim> claims) {

    /** Throws {@link IllegalArgumentException} for a share or distortion outside its range. */
    public Offer {
        claims = List.copyOf(claims);
        nonLinearShare.ifPresent(share -> require(
                share.signum() >= 0 && share.compareTo(BigDecimal.ONE) <= 0, "nonLinearShare", share, "0 to 1"));
        currentThd.ifPresent(thd -> require(thd.signum() >= 0, "currentThd", thd, "0 or more, where 0.3 means 30 %"));
    }

    /** An offer of which no more is known than its bank, its price and its claims. */
    public static Offer of(Proposal proposal, Claim... claims) {
        return new Offer(proposal, Optional.empty(), Optional.empty(), Optional.empty(), List.of(claims));
    }

    private static void require(boolean holds, String name, BigDecimal given, String allowed) {
        if (!holds) {
            throw new IllegalArgumentException(name + " is " + given.toPlainString() + "; allowed: " + allowed);
        }
    }
}
