// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static java.math.MathContext.DECIMAL128;

import java.math.BigDecimal;

/** An input that a verdict may hang on. */
public enum Driver {
    /** All months of the first and of the settled year. */
    SAVINGS {
        @Override
        Venture scaled(Venture venture, BigDecimal factor) {
            return venture.with(venture.savings().times(factor));
        }
    },
    /** Purchase and installation; incentives, replacements and residual value stay. */
    COST {
        @Override
        Venture scaled(Venture venture, BigDecimal factor) {
            Investment bank = venture.investment();
            return venture.with(bank.costing(
                    bank.purchase().multiply(factor), bank.installation().multiply(factor)));
        }
    },
    DISCOUNT_RATE {
        @Override
        Venture scaled(Venture venture, BigDecimal factor) {
            Outlook outlook = venture.outlook();
            return outlook.discountRate()
                    .map(rate -> venture.with(outlook.discountedAt(rate.multiply(factor, DECIMAL128))))
                    .orElse(venture);
        }
    },
    UPKEEP {
        @Override
        Venture scaled(Venture venture, BigDecimal factor) {
            Investment bank = venture.investment();
            return venture.with(bank.withYearlyUpkeep(bank.yearlyUpkeep().multiply(factor)));
        }
    },
    /** Of the savings; that of the upkeep stays. */
    ESCALATION {
        @Override
        Venture scaled(Venture venture, BigDecimal factor) {
            Outlook outlook = venture.outlook();
            return venture.with(
                    outlook.escalatingSavings(outlook.savingsEscalation().multiply(factor, DECIMAL128)));
        }
    };

    /** The venture with this input times a factor and all others as they are. */
    abstract Venture scaled(Venture venture, BigDecimal factor);
}
