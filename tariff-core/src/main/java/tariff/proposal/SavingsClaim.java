// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import tariff.correction.Estimate;
import tariff.proposal.Reviewed.Working;

/**
 * So much money, or so large a part of the bill, saved each year.
 *
 * @param amount in money; as a share of the year's bills if {@code ofBill}
 * @param ofBill whether the amount is a share
 * @param fromFirstYear whether it is said of the first year too
 */
public record SavingsClaim(BigDecimal amount, boolean ofBill, boolean fromFirstYear) implements Claim {

    /** A year's savings, said without exception for the first. */
    public static SavingsClaim yearly(BigDecimal money) {
        return new SavingsClaim(money, false, true);
    }

    /** Savings of a year once the ratchet has let go. */
    public static SavingsClaim settled(BigDecimal money) {
        return new SavingsClaim(money, false, false);
    }

    /** A share of the year's bills, 0.1 for 10 %. */
    public static SavingsClaim shareOfBill(BigDecimal share) {
        return new SavingsClaim(share, true, true);
    }

    @Override
    public String words() {
        String what = ofBill ? Words.percent(amount) + " of the bill" : Words.money(amount) + " a year";
        return "saves " + what + (fromFirstYear ? "" : ", once settled");
    }

    @Override
    public Reviewed review(Evidence evidence) {
        if (!evidence.hasFullYear()) {
            return new Reviewed(this, new Verdict.CannotTell("the bills of a full year"), List.of(), List.of());
        }
        BigDecimal billed = evidence.assessment().today().billed();
        BigDecimal money = ofBill ? amount.multiply(billed) : amount;
        List<Working> working = new ArrayList<>();
        if (ofBill) {
            working.add(new Working("the year's bills", Words.money(billed)));
            working.add(new Working("the claim in money", Words.money(money)));
        }
        return judge(money, evidence, working);
    }

    private Reviewed judge(BigDecimal money, Evidence evidence, List<Working> working) {
        BigDecimal low = settled(evidence, Estimate.LOW);
        BigDecimal central = settled(evidence, Estimate.CENTRAL).max(low);
        BigDecimal high = settled(evidence, Estimate.HIGH).max(central);
        BigDecimal first = evidence.savings(Estimate.CENTRAL).firstYearTotal();
        BigDecimal unity = evidence.assessment().today().toUnity();
        working.add(new Working("least that the bills promise", Words.money(low)));
        working.add(new Working("estimate between the bounds", Words.money(central)));
        working.add(new Working("most that the bills allow", Words.money(high)));
        if (first.compareTo(central) != 0) {
            working.add(new Working("estimate for the first year", Words.money(first)));
        }
        working.add(new Working("cost of being short of unity", Words.money(unity)));
        if (!within(money, high)) {
            boolean pastUnity = !within(money, unity);
            String point = pastUnity && evidence.assessment().today().point().named()
                    ? "; the rate pays up to "
                            + evidence.assessment().today().point().words()
                    : "";
            return new Reviewed(
                    this,
                    new Verdict.BeyondRate(
                            high,
                            "exceeds what the rate can give: this bank saves at most " + Words.money(high) + " a year"
                                    + point),
                    working,
                    pastUnity && unity.signum() > 0 ? List.of(Slip.UNITY_NOT_PAID) : List.of());
        }
        if (!within(money, central)) {
            return new Reviewed(this, new Verdict.HoldsOnlyIf(onlyIf(central)), working, List.of());
        }
        if (fromFirstYear && !within(money, first)) {
            return new Reviewed(
                    this,
                    new Verdict.HoldsOnlyIf(
                            "holds only from the second year on; the first saves about " + Words.money(first)),
                    working,
                    List.of(Slip.RATCHET_IGNORED));
        }
        return new Reviewed(
                this,
                new Verdict.Holds(
                        within(money, low)
                                ? "holds: the bills promise at least " + Words.money(low) + " a year"
                                : "holds by the estimate between the bounds, " + Words.money(central)
                                        + " a year; the bills alone promise " + Words.money(low)),
                working,
                List.of());
    }

    private static String onlyIf(BigDecimal central) {
        return "holds only if the load's timing is kinder than assumed: the estimate is " + Words.money(central)
                + " a year; interval data would tell";
    }

    private static BigDecimal settled(Evidence evidence, Estimate estimate) {
        return evidence.savings(estimate).settledYearTotal();
    }

    /** Claims are rounded: half a unit of money is no lie. */
    private static boolean within(BigDecimal claim, BigDecimal bound) {
        return claim.compareTo(bound.add(new BigDecimal("0.5"))) <= 0;
    }
}
