// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tariff.meter.Triangle;
import tariff.proposal.Reviewed.Working;

/**
 * The bank saves kWh.
 *
 * @param amount kWh a year; a share of the year's kWh if {@code ofAll}, 0.05 for 5 %
 * @param ofAll whether the amount is a share
 */
public record KwhClaim(BigDecimal amount, boolean ofAll) implements Claim {

    public static KwhClaim yearly(BigDecimal kwh) {
        return new KwhClaim(kwh, false);
    }

    public static KwhClaim share(BigDecimal share) {
        return new KwhClaim(share, true);
    }

    @Override
    public String words() {
        return "saves " + (ofAll ? Words.percent(amount) + " of the kWh" : Words.upTo(amount, 0) + " kWh a year");
    }

    @Override
    public Reviewed review(Evidence evidence) {
        Optional<BigDecimal> kwh = evidence.kwh().filter(all -> all.signum() > 0);
        if (!ofAll && (!evidence.hasFullYear() || kwh.isEmpty())) {
            return new Reviewed(this, new Verdict.CannotTell("the kWh of a full year"), List.of(), List.of());
        }
        List<Working> working = new ArrayList<>();
        BigDecimal share = ofAll ? amount : amount.divide(kwh.orElseThrow(), Triangle.PRECISION);
        if (!ofAll) {
            working.add(new Working("the year's kWh", Words.upTo(kwh.orElseThrow(), 0) + " kWh"));
            working.add(new Working("the claim as a share", Words.percent(share)));
        }
        return new LossBound(evidence).judge(this, share, working, Slip.KWH_FROM_NOWHERE, "kWh");
    }
}
