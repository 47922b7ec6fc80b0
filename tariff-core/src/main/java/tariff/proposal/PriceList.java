// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import tariff.correction.CapacitorBank;
import tariff.notice.Finding;
import tariff.notice.Refusal;
import tariff.payback.Investment;

/**
 * What banks cost, in the prices of whoever asks. There is no price of our own: none that can be cited is current.
 *
 * @param fixedPart paid once for any bank, 0 or more
 * @param perFixedKvar for each rated kvar that is always on, 0 or more
 * @param perSwitchedKvar for each rated kvar that is switched, 0 or more
 * @param perStep for each switched step, 0 or more
 * @param yearlyUpkeepShare yearly upkeep as a share of the cost, 0 to 1
 * @param lifeYears whole years in service, 1 to 60
 */
public record PriceList(
        BigDecimal fixedPart,
        BigDecimal perFixedKvar,
        BigDecimal perSwitchedKvar,
        BigDecimal perStep,
        BigDecimal yearlyUpkeepShare,
        int lifeYears) {

    /** @throws Refusal with every price that is below zero, an upkeep that is no share, a life outside its range */
    public PriceList {
        List<Finding> findings = new ArrayList<>();
        notNegative(findings, "/fixedPart", fixedPart);
        notNegative(findings, "/perFixedKvar", perFixedKvar);
        notNegative(findings, "/perSwitchedKvar", perSwitchedKvar);
        notNegative(findings, "/perStep", perStep);
        if (yearlyUpkeepShare.signum() < 0 || yearlyUpkeepShare.compareTo(BigDecimal.ONE) > 0) {
            findings.add(Finding.error(
                            "not-a-fraction", "/yearlyUpkeepShare", "must be a fraction of one, where 0.02 means 2 %")
                    .found(yearlyUpkeepShare.toPlainString())
                    .allowed("0 to 1"));
        }
        if (lifeYears < 1 || lifeYears > 60) {
            findings.add(Finding.error("out-of-range", "/lifeYears", "is out of range")
                    .found(Integer.toString(lifeYears))
                    .allowed("1 to 60"));
        }
        if (!findings.isEmpty()) {
            throw new Refusal(findings);
        }
    }

    /** One price for every kvar, fixed or switched, and nothing else. */
    public static PriceList perKvar(BigDecimal price, int lifeYears) {
        return new PriceList(BigDecimal.ZERO, price, price, BigDecimal.ZERO, BigDecimal.ZERO, lifeYears);
    }

    /** What a bank costs. */
    public Investment of(CapacitorBank bank) {
        BigDecimal switched = bank.ratedKvar().subtract(bank.fixedKvar());
        BigDecimal cost = fixedPart
                .add(perFixedKvar.multiply(bank.fixedKvar()))
                .add(perSwitchedKvar.multiply(switched))
                .add(perStep.multiply(BigDecimal.valueOf(bank.stepsKvar().size())));
        return Investment.plain(cost, cost.multiply(yearlyUpkeepShare), lifeYears);
    }

    private static void notNegative(List<Finding> findings, String where, BigDecimal amount) {
        if (amount.signum() < 0) {
            findings.add(Finding.error("negative", where, "is less than nothing")
                    .found(amount.toPlainString())
                    .allowed("0 or more"));
        }
    }
}
