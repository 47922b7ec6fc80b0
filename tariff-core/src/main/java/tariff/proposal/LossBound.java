// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import tariff.correction.Estimate;
import tariff.electrical.KwhShare;
import tariff.electrical.SeriesLosses;
import tariff.meter.Triangle;
import tariff.proposal.Reviewed.Working;

/**
 * Holds a claim about kWh or kW against the losses between meter and bank, the only ones that a bank lowers. Where an offer does not say
 * where the bank stands, the kindest place is taken, at the load. See {@link KwhShare}.
 */
record LossBound(Evidence evidence) {
    private static final BigDecimal DOUBTFUL = percent(KwhShare.DOUBTFUL_PERCENT);
    private static final BigDecimal INCREDIBLE = percent(KwhShare.INCREDIBLE_PERCENT);

    Reviewed judge(Claim claim, BigDecimal share, List<Working> working, Slip slip, String unit) {
        if (share.signum() <= 0) {
            return new Reviewed(claim, new Verdict.Holds("holds: nothing is claimed"), working, List.of());
        }
        Optional<BigDecimal> before = Evidence.powerFactor(evidence.before());
        Optional<BigDecimal> after = Evidence.powerFactor(evidence.after(Estimate.HIGH));
        if (before.isEmpty() || after.isEmpty()) {
            return new Reviewed(claim, new Verdict.CannotTell("the kWh and kvarh of each month"), working, List.of());
        }
        double cut = SeriesLosses.cutPercent(
                        before.get().doubleValue(),
                        after.get().max(before.get()).doubleValue())
                / 100;
        double lossPercent =
                evidence.offer().place().orElse(KwhShare.Place.AT_THE_LOAD).lossPercent();
        BigDecimal bound = percent(lossPercent * cut);
        working.add(new Working("power factor of the year before", Words.upTo(before.get(), 3)));
        working.add(new Working("power factor after, at best", Words.upTo(after.get(), 3)));
        working.add(new Working("cut of the losses before the bank", Words.percent(BigDecimal.valueOf(cut))));
        working.add(new Working("losses usual at " + place(), Words.percent(percent(lossPercent)) + " of the kWh"));
        working.add(new Working("most that a bank saves there", Words.percent(bound) + " of the " + unit));
        if (share.compareTo(bound) <= 0) {
            return new Reviewed(
                    claim,
                    new Verdict.Holds(
                            "holds: losses before the bank may fall by " + Words.percent(bound) + " of the " + unit),
                    working,
                    List.of());
        }
        List<Slip> slips = share.compareTo(DOUBTFUL) > 0 || lossPercent == 0 ? List.of(slip) : List.of();
        if (share.compareTo(INCREDIBLE) > 0 || lossPercent == 0 || cut <= 0) {
            return new Reviewed(
                    claim,
                    new Verdict.BeyondPhysics(
                            bound,
                            "exceeds what physics can give: at " + place() + " a bank saves at most "
                                    + Words.percent(bound) + " of the " + unit),
                    working,
                    slips.isEmpty() ? List.of(slip) : slips);
        }
        BigDecimal needed = share.divide(BigDecimal.valueOf(cut), Triangle.PRECISION);
        return new Reviewed(
                claim,
                new Verdict.HoldsOnlyIf("holds only if at least " + Words.percent(needed) + " of the " + unit
                        + " are lost between the meter and the bank; usual at " + place() + " are "
                        + Words.percent(percent(lossPercent))),
                working,
                slips);
    }

    private String place() {
        return switch (evidence.offer().place().orElse(KwhShare.Place.AT_THE_LOAD)) {
            case AT_THE_METER -> "the meter";
            case BEHIND_OWN_TRANSFORMER -> "the low-voltage side of the own transformer";
            case AT_THE_LOAD -> "the load";
        };
    }

    private static BigDecimal percent(double percent) {
        return BigDecimal.valueOf(percent).movePointLeft(2);
    }
}
