// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.util.Optional;
import java.util.function.UnaryOperator;
import tariff.meter.MeteredMonth;
import tariff.meter.MonthlySums;

/**
 * The months of interval data behind one bank after another: from one sorting for all sizes where that gives all that is asked, else by a
 * walk. Lives for one question.
 */
public final class ExactMonths {
    private final MonthlySums sums;
    private final Optional<BankSizes> sizes;

    /** @param looksInside whether the hours or days inside the months are asked for too */
    public ExactMonths(MonthlySums sums, boolean looksInside) {
        this.sums = sums;
        this.sizes = looksInside || !BankSizes.suits(sums) ? Optional.empty() : Optional.of(new BankSizes(sums));
    }

    /**
     * What the bank makes of one of the months of the sums.
     *
     * @throws IllegalArgumentException as {@link BankYear#of}
     */
    public UnaryOperator<MeteredMonth> behind(CapacitorBank bank) {
        boolean alwaysTheSame = !bank.isAutomatic()
                && bank.off().isEmpty()
                && bank.wattsPerKvar().signum() == 0;
        if (sizes.isPresent() && alwaysTheSame) {
            return month -> sizes.get().month(month, bank.effectiveFixedKvar());
        }
        BankYear walked = BankYear.of(sums, bank);
        return month -> walked.month(month.period());
    }
}
