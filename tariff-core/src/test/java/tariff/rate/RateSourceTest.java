// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.List;
import org.junit.jupiter.api.Test;
import tariff.bill.Bills;
import tariff.json.RateFile;

class RateSourceTest {
    private static final Rate RATE =
            RateFile.parse(Bills.rate("{ 'name': 'Demand', 'quantity': { 'peak': 'kVA' }, 'price': 10 }"));

    @Test
    void aRateWrittenOtherwiseLeavesTheFirstAsItWas() {
        RateSource dearer =
                RATE.source().rewritten(value -> value.equals(BigDecimal.TEN) ? new BigDecimal("12") : value);
        assertThat(dearer.compiled().orElseThrow().words().lines())
                .containsExactly("Demand: highest kVA, at 12 per kVA.");
        assertThat(RATE.words().lines()).containsExactly("Demand: highest kVA, at 10 per kVA.");
    }

    @Test
    void whatIsWrittenTheSameIsEqual() {
        assertThat(RATE.source().rewritten(value -> value)).isEqualTo(RATE.source());
    }

    @Test
    void whatIsNoRateDoesNotCompile() {
        assertThat(RATE.source().without("lines").compiled()).isEmpty();
        assertThat(RATE.source().with("lines", List.of()).compiled()).isEmpty();
    }
}
