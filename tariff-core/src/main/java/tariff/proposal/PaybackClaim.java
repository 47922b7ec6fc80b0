// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import tariff.correction.Estimate;
import tariff.meter.Triangle;
import tariff.payback.Appraisal;
import tariff.payback.Investment;
import tariff.proposal.Reviewed.Working;

/**
 * The bank pays for itself within so many years.
 *
 * @param years above 0
 */
public record PaybackClaim(BigDecimal years) implements Claim {
    private static final BigDecimal YEAR = BigDecimal.valueOf(12);
    /** Claims are rounded: a hundredth of the time is no lie. */
    private static final BigDecimal ROUNDED = new BigDecimal("1.01");

    public static PaybackClaim months(int months) {
        return new PaybackClaim(BigDecimal.valueOf(months).divide(YEAR, Triangle.PRECISION));
    }

    @Override
    public String words() {
        return "pays back in " + years(years);
    }

    @Override
    public Reviewed review(Evidence evidence) {
        Optional<Investment> investment = evidence.offer().proposal().investment();
        if (investment.isEmpty()) {
            return new Reviewed(this, new Verdict.CannotTell("the price and the yearly upkeep"), List.of(), List.of());
        }
        if (!evidence.hasFullYear()) {
            return new Reviewed(this, new Verdict.CannotTell("the bills of a full year"), List.of(), List.of());
        }
        List<Working> working = new ArrayList<>();
        working.add(new Working("cost", Words.money(investment.get().netCost())));
        working.add(new Working("yearly upkeep", Words.money(investment.get().yearlyUpkeep())));
        Optional<BigDecimal> central = soonest(evidence, Estimate.CENTRAL);
        Optional<BigDecimal> high = soonest(evidence, Estimate.HIGH);
        central.ifPresent(time -> working.add(new Working("payback by the estimate between the bounds", years(time))));
        high.ifPresent(time -> working.add(new Working("payback by the most that the bills allow", years(time))));
        return new Reviewed(
                this, verdict(evidence, central, high), working, slips(evidence, investment.get(), central));
    }

    private Verdict verdict(Evidence evidence, Optional<BigDecimal> central, Optional<BigDecimal> high) {
        if (central.filter(this::reaches).isPresent()) {
            return new Verdict.Holds(
                    "holds: by the estimate between the bounds the cost is back in " + years(central.get()));
        }
        if (high.filter(this::reaches).isPresent()) {
            return new Verdict.HoldsOnlyIf("holds only if the load's timing is kinder than assumed: the estimate is "
                    + central.map(PaybackClaim::years).orElse("that the cost is not recovered")
                    + "; interval data would tell");
        }
        if (high.isPresent()) {
            return new Verdict.BeyondRate(
                    high.get(),
                    "exceeds what the rate can give: the cost is back in " + years(high.get()) + " at best");
        }
        String why = appraisal(evidence, Estimate.HIGH).simplePaybackYears().fold(time -> "", reason -> ": " + reason);
        return new Verdict.BeyondRate(BigDecimal.ZERO, "exceeds what the rate can give" + why);
    }

    private List<Slip> slips(Evidence evidence, Investment investment, Optional<BigDecimal> central) {
        List<Slip> slips = new ArrayList<>();
        if (central.filter(this::reaches).isPresent()) {
            Optional<Integer> lasting =
                    appraisal(evidence, Estimate.CENTRAL).payback().lasting().optional();
            boolean delayed = evidence.assessment().billing().rate().looksBack()
                    && lasting.filter(month ->
                                    years.multiply(YEAR).multiply(ROUNDED).compareTo(BigDecimal.valueOf(month - 1L))
                                            <= 0)
                            .isPresent();
            return delayed ? List.of(Slip.RATCHET_IGNORED) : List.of();
        }
        BigDecimal gross = evidence.savings(Estimate.CENTRAL).settledYearTotal();
        if (investment.yearlyUpkeep().signum() > 0
                && gross.signum() > 0
                && reaches(investment.netCost().divide(gross, Triangle.PRECISION))) {
            slips.add(Slip.UPKEEP_IGNORED);
        }
        evidence.offer().claims().stream()
                .filter(SavingsClaim.class::isInstance)
                .map(SavingsClaim.class::cast)
                .filter(claim -> claim.amount().signum() > 0
                        && !claim.ofBill()
                        && claim.review(evidence).verdict() instanceof Verdict.BeyondRate
                        && isAbout(investment.netCost().divide(claim.amount(), Triangle.PRECISION)))
                .findFirst()
                .ifPresent(claim -> slips.add(Slip.ON_CLAIMED_SAVINGS));
        return slips;
    }

    /** Within a tenth. */
    private boolean isAbout(BigDecimal time) {
        return years.subtract(time).abs().multiply(BigDecimal.TEN).compareTo(time) <= 0;
    }

    private boolean reaches(BigDecimal time) {
        return years.multiply(ROUNDED).compareTo(time) >= 0;
    }

    /** The sooner of cost ÷ net savings of a settled year and the month-by-month payback. */
    private static Optional<BigDecimal> soonest(Evidence evidence, Estimate estimate) {
        Appraisal appraisal = appraisal(evidence, estimate);
        Optional<BigDecimal> simple = appraisal.simplePaybackYears().optional();
        Optional<BigDecimal> byMonth = appraisal
                .payback()
                .lasting()
                .optional()
                .map(month -> BigDecimal.valueOf(month).divide(YEAR, Triangle.PRECISION));
        return simple.map(time -> byMonth.map(time::min).orElse(time)).or(() -> byMonth);
    }

    private static Appraisal appraisal(Evidence evidence, Estimate estimate) {
        return Objects.requireNonNull(evidence.assessment().appraisals().get(estimate));
    }

    private static String years(BigDecimal years) {
        String number = Words.upTo(years, 2);
        return number + (number.equals("1") ? " year" : " years");
    }
}
