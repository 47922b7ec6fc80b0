// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static java.math.MathContext.DECIMAL128;

import java.math.BigDecimal;

/**
 * Tax month by month: rate × (savings − upkeep − replacements − depreciation), paid in the month it arises. The cost net of
 * incentives is written off in equal monthly parts over the depreciation years. At the end of the life the residual value less
 * what is not yet written off is a gain like any other. A loss lowers the tax on the owner's other income. Common practice, no
 * source; a tax office may time and allow otherwise.
 */
final class Tax {
    private final Taxation taxation;
    private final Investment investment;

    Tax(Venture venture) {
        this.taxation = venture.outlook().taxation().orElse(new Taxation(BigDecimal.ZERO, 1));
        this.investment = venture.investment();
    }

    Month on(Month month) {
        if (taxation.rate().signum() == 0) {
            return month;
        }
        BigDecimal gain = month.savings()
                .add(month.residual())
                .subtract(month.upkeep())
                .subtract(month.replacements())
                .subtract(writtenOffIn(month.number()));
        return new Month(
                month.number(),
                month.investment(),
                month.savings(),
                month.upkeep(),
                month.replacements(),
                month.residual(),
                gain.multiply(taxation.rate(), DECIMAL128));
    }

    private BigDecimal writtenOffIn(int month) {
        int parts = 12 * taxation.depreciationYears();
        int partsNow = month > parts ? 0 : month == 12 * investment.lifeYears() ? parts - month + 1 : 1;
        return investment
                .netCost()
                .multiply(BigDecimal.valueOf(partsNow))
                .divide(BigDecimal.valueOf(parts), DECIMAL128);
    }
}
