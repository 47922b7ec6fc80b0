// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;

/**
 * What one line of the bill costs because of reactive load.
 *
 * @param line as the rate names it
 * @param asItIs the line's amount
 * @param penalty what of it is paid for being short of the no-penalty point; below zero where a credit is given up there
 * @param toUnity what of it is paid for being short of unity
 * @param shownOnly not part of the total
 */
public record LineCost(String line, BigDecimal asItIs, BigDecimal penalty, BigDecimal toUnity, boolean shownOnly) {

    /** Whether reactive load moves the line at all. */
    public boolean bites() {
        return penalty.signum() != 0 || toUnity.signum() != 0;
    }

    /** The lines of one month, in the rate's order. */
    public static List<LineCost> of(PowerFactorCost.Month month) {
        return month.asItIs().lines().stream()
                .map(line -> new LineCost(
                        line.name(),
                        line.amount(),
                        month.penalty(line.name()),
                        line.amount().subtract(month.atUnity().amount(line.name())),
                        line.shownOnly()))
                .toList();
    }

    /** The lines of several months together, in the rate's order. */
    public static List<LineCost> of(PowerFactorCost months) {
        return months.months().stream().map(LineCost::of).reduce(LineCost::plus).orElse(List.of());
    }

    private static List<LineCost> plus(List<LineCost> some, List<LineCost> others) {
        List<LineCost> sums = new ArrayList<>();
        for (int i = 0; i < some.size(); i++) {
            sums.add(some.get(i).plus(others.get(i)));
        }
        return sums;
    }

    private LineCost plus(LineCost other) {
        return new LineCost(
                line, asItIs.add(other.asItIs), penalty.add(other.penalty), toUnity.add(other.toUnity), shownOnly);
    }
}
