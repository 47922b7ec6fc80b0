// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static tariff.payback.Ventures.flows;
import static tariff.payback.Ventures.known;
import static tariff.payback.Ventures.money;

import java.math.BigDecimal;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The examples by which spreadsheets document NPV, IRR and MIRR. */
class SpreadsheetFunctionsTest {

    // A leading 0 where the spreadsheet discounts its first value by one period
    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            0.10 | 0 -10000 3000 4200 6800                   |  1188.4434123 | documentation of NPV, first example
            0.08 | -40000 8000 9200 10000 12000 14500        |  1922.0615549 | documentation of NPV (from memory)
            0.08 | -40000 8000 9200 10000 12000 14500 -9000  | -3749.4650870 | documentation of NPV (from memory)
            0.08 | -40000 5000 8000 12000 30000              |  3065.2226682 | a numeric library's documentation (from memory)
            """)
    void presentValue(BigDecimal rate, String flows, BigDecimal expected, String source) {
        assertThat(PresentValue.of(flows(flows), rate)).as(source).isCloseTo(expected, within(money("6e-8")));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            -70000 12000 15000 18000 21000       | -0.0212448483 | documentation of IRR
            -70000 12000 15000 18000 21000 26000 |  0.0866309480 | documentation of IRR
            -70000 12000 15000                   | -0.4435069413 | documentation of IRR
            -100 39 59 55 20                     |  0.2809484211 | a numeric library's documentation (from memory)
            -100 110                             |  0.1          | own arithmetic: 110/100 - 1
            -100 50 50                           |  0            | own arithmetic: the cost comes back, no more
            -1000 100 100 1100                   |  0.1          | own arithmetic: a 10 % bond at par
            """)
    void internalReturn(String flows, BigDecimal expected, String source) {
        assertThat(known(InternalReturn.ofYears(flows(flows)))).as(source).isCloseTo(expected, within(money("6e-11")));
    }

    @Test
    void modifiedReturn() {
        // documentation of MIRR
        Answer<BigDecimal> mirr =
                ModifiedReturn.of(flows("-120000 39000 30000 21000 37000 46000"), money("0.10"), money("0.12"));
        assertThat(known(mirr)).isCloseTo(money("0.1260941304"), within(money("6e-11")));
    }
}
