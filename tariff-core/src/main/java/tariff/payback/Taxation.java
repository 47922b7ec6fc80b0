// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import java.math.BigDecimal;

/**
 * Tax on what the bank earns, with its cost written off in equal parts (straight line, to nothing).
 *
 * <p>Values outside their ranges are refused, all at once, with a {@link tariff.notice.Refusal}.
 *
 * @param rate share of the taxable gain, 0 to 1
 * @param depreciationYears whole years, 1 to 60, over which the cost net of incentives is written off
 */
public record Taxation(BigDecimal rate, int depreciationYears) {
    public Taxation {
        new Checks()
                .fraction("/rate", rate, "0")
                .whole("/depreciationYears", depreciationYears, 1, 60)
                .refuseIfAny();
    }
}
