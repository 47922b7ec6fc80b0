// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tariff.correction.Estimate;
import tariff.electrical.Distortion;
import tariff.meter.MeteredMonth;
import tariff.proposal.Reviewed.Working;

/**
 * Every month's power factor will be so high.
 *
 * @param powerFactor above 0, at most 1
 */
public record PowerFactorClaim(BigDecimal powerFactor) implements Claim {
    /** Claims are rounded: half a thousandth is no lie. */
    private static final BigDecimal ROUNDED = new BigDecimal("0.0005");

    @Override
    public String words() {
        return "brings every month to power factor " + Words.upTo(powerFactor, 3);
    }

    @Override
    public Reviewed review(Evidence evidence) {
        Optional<BigDecimal> before = lowest(evidence.before());
        Optional<BigDecimal> central = lowest(evidence.after(Estimate.CENTRAL));
        Optional<BigDecimal> high = lowest(evidence.after(Estimate.HIGH));
        if (before.isEmpty() || central.isEmpty() || high.isEmpty()) {
            return new Reviewed(this, new Verdict.CannotTell("the kWh and kvarh of each month"), List.of(), List.of());
        }
        List<Working> working = new ArrayList<>();
        working.add(new Working("lowest month before", Words.upTo(before.get(), 3)));
        working.add(
                new Working("lowest month after, by the estimate between the bounds", Words.upTo(central.get(), 3)));
        working.add(new Working("lowest month after, at best", Words.upTo(high.get(), 3)));
        Optional<BigDecimal> ceiling = evidence.offer()
                .currentThd()
                .map(thd -> BigDecimal.valueOf(Distortion.ceiling(before.get().doubleValue(), thd.doubleValue())));
        if (ceiling.isPresent()) {
            working.add(new Working("best that capacitors reach with this distortion", Words.upTo(ceiling.get(), 3)));
            if (!within(ceiling.get())) {
                return beyond(
                        ceiling.get(),
                        "with this distortion capacitors reach power factor " + Words.upTo(ceiling.get(), 3)
                                + " at best",
                        working,
                        Slip.DISTORTION_IGNORED);
            }
        }
        if (!within(high.get())) {
            return beyond(
                    high.get(),
                    "this bank brings the lowest month to " + Words.upTo(high.get(), 3) + " at best",
                    working,
                    Slip.TOO_FEW_KVAR);
        }
        Verdict verdict = within(central.get())
                ? new Verdict.Holds("holds by the estimate between the bounds, " + Words.upTo(central.get(), 3)
                        + " in the lowest month")
                : new Verdict.HoldsOnlyIf("holds only if the load's timing is kinder than assumed: the estimate is "
                        + Words.upTo(central.get(), 3) + " in the lowest month; interval data would tell");
        return new Reviewed(this, verdict, working, List.of());
    }

    private Reviewed beyond(BigDecimal bound, String why, List<Working> working, Slip slip) {
        return new Reviewed(
                this,
                new Verdict.BeyondPhysics(bound, "exceeds what physics can give: " + why),
                working,
                List.of(slip));
    }

    private boolean within(BigDecimal bound) {
        return powerFactor.compareTo(bound.add(ROUNDED)) <= 0;
    }

    /** Empty if a month has none that can be told. */
    private static Optional<BigDecimal> lowest(List<MeteredMonth> months) {
        List<Optional<BigDecimal>> each = months.stream()
                .map(month -> Evidence.powerFactor(List.of(month)))
                .toList();
        return each.stream().anyMatch(Optional::isEmpty)
                ? Optional.empty()
                : each.stream().flatMap(Optional::stream).min(BigDecimal::compareTo);
    }
}
