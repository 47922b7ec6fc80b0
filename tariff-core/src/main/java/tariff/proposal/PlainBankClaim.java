// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import tariff.proposal.Reviewed.Working;

/** The bank needs no detuning reactor; every plain bank claims it. Limits are common practice, no source: 15 and 25 % of the load. */
public record PlainBankClaim() implements Claim {
    private static final BigDecimal USUALLY_SAFE = new BigDecimal("0.15");
    private static final BigDecimal MUST_NOT = new BigDecimal("0.25");

    @Override
    public String words() {
        return "needs no detuning reactor";
    }

    @Override
    public Reviewed review(Evidence evidence) {
        Optional<BigDecimal> share = evidence.offer().nonLinearShare();
        List<Working> working =
                share.map(part -> new Working("non-linear part of the load", Words.percent(part))).stream()
                        .toList();
        return new Reviewed(this, verdict(share), working, List.of());
    }

    private static Verdict verdict(Optional<BigDecimal> share) {
        if (share.isEmpty()) {
            return new Verdict.CannotTell(
                    "the part of the load that is drives and rectifiers, and measured harmonics,");
        }
        String part = Words.percent(share.get()) + " of the load is non-linear";
        if (share.get().compareTo(USUALLY_SAFE) <= 0) {
            return new Verdict.HoldsOnlyIf("holds only if measured harmonics and a resonance check agree; " + part);
        }
        if (share.get().compareTo(MUST_NOT) <= 0) {
            return new Verdict.HoldsOnlyIf(
                    "holds only if a harmonic study says so, before anything is bought; " + part);
        }
        return new Verdict.BeyondPhysics(
                MUST_NOT,
                "this site must not get a plain bank: " + part
                        + ", and capacitors without reactors would resonate with its harmonics or be overloaded by them; ask for a"
                        + " detuned bank or a filter, designed on measured harmonics");
    }
}
