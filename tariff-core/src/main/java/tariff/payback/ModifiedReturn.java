// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static java.math.BigDecimal.ONE;
import static java.math.MathContext.DECIMAL128;

import java.math.BigDecimal;
import java.util.List;

/** The modified internal rate of return (MIRR), which is never ambiguous. */
public final class ModifiedReturn {
    private ModifiedReturn() {}

    /**
     * (gains carried to the end at the reinvestment rate ÷ costs brought to the start at the finance rate)^(1/n) − 1.
     *
     * @param flows period 0 first
     * @param financeRate paid on costs, per period, above −1
     * @param reinvestmentRate earned on gains, per period, above −1
     */
    public static Answer<BigDecimal> of(List<BigDecimal> flows, BigDecimal financeRate, BigDecimal reinvestmentRate) {
        BigDecimal costs =
                PresentValue.of(flows.stream().map(BigDecimal.ZERO::min).toList(), financeRate);
        BigDecimal gains =
                PresentValue.of(flows.stream().map(BigDecimal.ZERO::max).toList(), reinvestmentRate);
        if (costs.signum() == 0) {
            return Answer.notApplicable("no flow is a cost, so there is nothing to earn a return on");
        }
        if (gains.signum() == 0) {
            return Answer.notApplicable("no flow is a gain, so no rate of return recovers the cost");
        }
        BigDecimal ratio = gains.divide(costs.negate(), DECIMAL128);
        BigDecimal growth = NthRoot.of(ratio, flows.size() - 1).multiply(ONE.add(reinvestmentRate), DECIMAL128);
        return Answer.known(growth.subtract(ONE));
    }
}
