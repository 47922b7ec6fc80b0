// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import static tariff.meter.Register.PEAK_KW;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tariff.meter.Triangle;
import tariff.proposal.Reviewed.Working;

/**
 * The bank lowers the highest kW.
 *
 * @param kw by how much, 0 or more
 */
public record KwClaim(BigDecimal kw) implements Claim {

    @Override
    public String words() {
        return "lowers the demand by " + Words.upTo(kw, 2) + " kW";
    }

    @Override
    public Reviewed review(Evidence evidence) {
        Optional<BigDecimal> peak =
                Evidence.highest(evidence.before(), PEAK_KW).filter(highest -> highest.signum() > 0);
        if (peak.isEmpty()) {
            return new Reviewed(this, new Verdict.CannotTell("the highest kW of each month"), List.of(), List.of());
        }
        BigDecimal share = kw.divide(peak.get(), Triangle.PRECISION);
        List<Working> working = new ArrayList<>();
        working.add(new Working("highest kW of the year", Words.upTo(peak.get(), 2) + " kW"));
        working.add(new Working("the claim as a share", Words.percent(share)));
        return new LossBound(evidence).judge(this, share, working, Slip.KW_NOT_LOWERED, "kW");
    }
}
