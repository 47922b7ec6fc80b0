// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import tariff.electrical.BankAtSite;
import tariff.electrical.Screening;
import tariff.proposal.Reviewed.Working;

/**
 * The bank needs no detuning reactor; every plain bank claims it. Limits are common practice, no source: 15 and 25 % of the load; where the
 * site is known, the harmonic screens are asked too, and the sterner of the two answers counts.
 */
public record PlainBankClaim() implements Claim {
    private static final BigDecimal USUALLY_SAFE = new BigDecimal("0.15");
    private static final BigDecimal MUST_NOT = new BigDecimal("0.25");
    private static final String STUDY = "holds only if a harmonic study says so, before anything is bought; ";

    @Override
    public String words() {
        return "needs no detuning reactor";
    }

    @Override
    public Reviewed review(Evidence evidence) {
        Optional<BigDecimal> share = evidence.offer().nonLinearShare();
        List<Screening> screens = evidence.offer()
                .proposal()
                .atSite()
                .map(BankAtSite::harmonicScreens)
                .orElse(List.of());
        List<Working> working = new ArrayList<>();
        share.ifPresent(part -> working.add(new Working("non-linear part of the load", Words.percent(part))));
        screens.stream()
                .filter(screen -> screen.value().isPresent())
                .forEach(screen -> working.add(new Working(screen.name(), screen.found())));
        return new Reviewed(this, verdict(share, screens, isNonLinearLoadKnown(evidence)), working, List.of());
    }

    private static Verdict verdict(Optional<BigDecimal> share, List<Screening> screens, boolean known) {
        if (share.filter(part -> part.compareTo(MUST_NOT) > 0).isPresent()) {
            return mustNot(MUST_NOT, nonLinear(share.get()));
        }
        String stops = found(screens, tariff.electrical.Verdict.STOP);
        if (!stops.isEmpty()) {
            return mustNot(USUALLY_SAFE, stops);
        }
        if (share.filter(part -> part.compareTo(USUALLY_SAFE) > 0).isPresent()) {
            return new Verdict.HoldsOnlyIf(STUDY + nonLinear(share.get()));
        }
        String doubts = found(screens, tariff.electrical.Verdict.LOOK_CLOSER);
        if (!doubts.isEmpty()) {
            return new Verdict.HoldsOnlyIf(STUDY + doubts);
        }
        if (!known) {
            return new Verdict.CannotTell(
                    "the part of the load that is drives and rectifiers, and measured harmonics,");
        }
        return new Verdict.HoldsOnlyIf("holds only if measured harmonics and a resonance check agree; "
                + share.map(PlainBankClaim::nonLinear).orElseGet(() -> found(screens, tariff.electrical.Verdict.FINE)));
    }

    private static boolean isNonLinearLoadKnown(Evidence evidence) {
        return evidence.offer().nonLinearShare().isPresent()
                || evidence.offer()
                        .proposal()
                        .atSite()
                        .filter(at -> at.site().nonLinearShare().isPresent())
                        .isPresent();
    }

    /** @param bound the non-linear part of the load from which such a bank is too bold */
    private static Verdict mustNot(BigDecimal bound, String why) {
        return new Verdict.BeyondPhysics(
                bound,
                "this site must not get a plain bank: " + why
                        + ", and capacitors without reactors would resonate with its harmonics or be overloaded by them; ask for a"
                        + " detuned bank or a filter, designed on measured harmonics");
    }

    private static String nonLinear(BigDecimal share) {
        return Words.percent(share) + " of the load is non-linear";
    }

    private static String found(List<Screening> screens, tariff.electrical.Verdict verdict) {
        return screens.stream()
                .filter(screen -> screen.verdict() == verdict)
                .map(Screening::found)
                .collect(Collectors.joining("; "));
    }
}
