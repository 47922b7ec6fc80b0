// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static tariff.payback.Ventures.flows;
import static tariff.payback.Ventures.known;
import static tariff.payback.Ventures.money;
import static tariff.payback.Ventures.reason;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class InternalReturnTest {

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            # own arithmetic: 230/1.1 - 132/1.21 = 100 and 230/1.2 - 132/1.44 = 100
            -100 230 -132         | flows change sign more than once and several rates fit: 10 % and 20 %; use the net present value
            # own arithmetic: (v - 1/1.10)(v - 1/1.101) x -121.11 with v = 1/(1+r), so 10 % and 10.1 %
            -100 220.1 -121.11    | flows change sign more than once and several rates fit: 10 % and 10.1 %; use the net present value
            # own arithmetic: -1000(x-1.1)(x-1.2)(x-1.3), x = 1+r
            -1000 3600 -4310 1716 | flows change sign more than once and several rates fit: 10 %, 20 % and 30 %; use the net present value
            # own arithmetic: discriminant 100^2 - 4 x 100 x 100 is below 0
            -100 100 -100         | no rate of return fits these flows; use the net present value
            -100 0 -5             | no flow is a gain, so no rate of return recovers the cost
            0 0 0                 | no flow is a cost, so there is nothing to earn a return on
            50 10 0               | no flow is a cost, so there is nothing to earn a return on
            """)
    void saysWhyThereIsNoSingleRate(String flows, String reason) {
        assertThat(reason(InternalReturn.ofYears(flows(flows)))).isEqualTo(reason);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            -100 220 -121     | 0.1  | own arithmetic: -100(x-1.1)^2, the curve only touches nothing
            -1000 1600 -480   | 0.2  | own arithmetic: -1000(x-1.2)(x-0.4), and -60 % is passed over as there is a gain
            -1 5000000        | 4999999 | own arithmetic: 5000000/1 - 1
            """)
    void givesTheOneRateThatMeansSomething(String flows, BigDecimal rate, String source) {
        assertThat(known(InternalReturn.ofYears(flows(flows))))
                .as(source)
                .isCloseTo(rate, within(rate.multiply(money("1e-7"))));
    }

    @Test
    void monthlyFlowsGiveTheEffectiveYearlyRate() {
        // own arithmetic: 100 grows to 108 in twelve months
        List<BigDecimal> flows = new ArrayList<>(Collections.nCopies(13, BigDecimal.ZERO));
        flows.set(0, money("-100"));
        flows.set(12, money("108"));
        assertThat(known(InternalReturn.ofMonths(flows))).isCloseTo(money("0.08"), within(money("1e-12")));
    }

    @Test
    void modifiedReturnNeedsBothACostAndAGain() {
        BigDecimal rate = money("0.1");
        assertThat(reason(ModifiedReturn.of(flows("0 5 5"), rate, rate)))
                .isEqualTo("no flow is a cost, so there is nothing to earn a return on");
        assertThat(reason(ModifiedReturn.of(flows("-5 0 -5"), rate, rate)))
                .isEqualTo("no flow is a gain, so no rate of return recovers the cost");
    }

    @Test
    void modifiedReturnIsSingleWhereInternalReturnIsNot() {
        // own arithmetic at 10 %: 230 x 1.1 / (100 + 132/1.21) = 253/209.0909 = 1.21, root 1.1
        assertThat(known(ModifiedReturn.of(flows("-100 230 -132"), money("0.1"), money("0.1"))))
                .isCloseTo(money("0.1"), within(money("1e-30")));
    }
}
