// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import java.math.BigDecimal;

/**
 * One month of a cash flow. Costs are positive amounts that are paid, savings positive amounts that are not.
 *
 * @param number 0 for the investment, then 1 to 12 × life
 * @param investment purchase and installation less incentives; in month 0 only
 * @param savings off the bills of the month
 * @param upkeep a twelfth of the year's
 * @param replacements at the end of their year
 * @param residual at the end of the life
 * @param tax on the month's gain; less than nothing where the gain is a loss that lowers the owner's other tax
 */
public record Month(
        int number,
        BigDecimal investment,
        BigDecimal savings,
        BigDecimal upkeep,
        BigDecimal replacements,
        BigDecimal residual,
        BigDecimal tax) {

    /** What the month adds to the owner's purse. */
    public BigDecimal net() {
        return operating().subtract(capital());
    }

    /** Savings less upkeep and tax. */
    BigDecimal operating() {
        return savings.subtract(upkeep).subtract(tax);
    }

    /** Investment and replacements less residual value. */
    BigDecimal capital() {
        return investment.add(replacements).subtract(residual);
    }
}
