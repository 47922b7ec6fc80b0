// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import java.math.BigDecimal;
import java.util.List;

/**
 * What a bank costs over its life.
 *
 * <p>Values outside their ranges are refused, all at once, with a {@link tariff.notice.Refusal}.
 *
 * @param purchase price of the equipment, 0 or more
 * @param installation everything else paid until it is in service, 0 or more
 * @param incentives what others pay of it, received with the investment, 0 or more
 * @param yearlyUpkeep inspection, repairs and losses of the first year, 0 or more
 * @param lifeYears whole years in service, 1 to 60
 * @param replacements later purchases within the life
 * @param residual value at the end of the life; less than nothing if removal costs more than the scrap brings
 */
public record Investment(
        BigDecimal purchase,
        BigDecimal installation,
        BigDecimal incentives,
        BigDecimal yearlyUpkeep,
        int lifeYears,
        List<Replacement> replacements,
        BigDecimal residual) {
    public Investment {
        replacements = List.copyOf(replacements);
        Checks checks = new Checks()
                .notNegative("/purchase", purchase)
                .notNegative("/installation", installation)
                .notNegative("/incentives", incentives)
                .notNegative("/yearlyUpkeep", yearlyUpkeep)
                .whole("/lifeYears", lifeYears, 1, 60);
        for (int i = 0; i < replacements.size(); i++) {
            checks.whole("/replacements/" + i + "/year", replacements.get(i).year(), 1, Math.max(1, lifeYears))
                    .notNegative(
                            "/replacements/" + i + "/cost", replacements.get(i).cost());
        }
        checks.refuseIfAny();
    }

    /** A bank with no incentive, replacement or residual value. */
    public static Investment plain(BigDecimal purchase, BigDecimal yearlyUpkeep, int lifeYears) {
        return new Investment(
                purchase, BigDecimal.ZERO, BigDecimal.ZERO, yearlyUpkeep, lifeYears, List.of(), BigDecimal.ZERO);
    }

    /** Purchase and installation, before incentives. */
    public BigDecimal installedCost() {
        return purchase.add(installation);
    }

    /** Purchase and installation less incentives; less than nothing if the incentives exceed them. */
    public BigDecimal netCost() {
        return installedCost().subtract(incentives);
    }

    Investment costing(BigDecimal newPurchase, BigDecimal newInstallation) {
        return new Investment(
                newPurchase, newInstallation, incentives, yearlyUpkeep, lifeYears, replacements, residual);
    }

    Investment withYearlyUpkeep(BigDecimal newUpkeep) {
        return new Investment(purchase, installation, incentives, newUpkeep, lifeYears, replacements, residual);
    }
}
