// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import java.math.BigDecimal;
import java.util.List;
import tariff.meter.MeteredMonth;
import tariff.notice.Assumption;

/**
 * What a rate asks for a month.
 *
 * @param month what was metered
 * @param currency ISO 4217 code
 * @param lines in the rate's order
 * @param total the sum of the lines that are not only shown, rounded as the rate says
 * @param assumptions what had to be taken to be so
 */
public record Statement(
        MeteredMonth month,
        String currency,
        List<StatementLine> lines,
        BigDecimal total,
        List<Assumption> assumptions) {

    /** The amount of a line by name, zero for a line that the rate does not have. */
    public BigDecimal amount(String line) {
        return lines.stream()
                .filter(each -> each.name().equals(line))
                .map(StatementLine::amount)
                .findFirst()
                .orElse(BigDecimal.ZERO);
    }
}
