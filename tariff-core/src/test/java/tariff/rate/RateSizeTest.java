// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** A rate may not be larger than can be worked out, however few words it is written in. */
class RateSizeTest {
    private static final String TOO_LARGE = "is too large to be worked out once names and past months are written out;"
            + " allowed: at most 200000 clauses, names 400 deep";

    private static List<String> findings(Map<String, Object> quantities, Object billed) {
        Object line = Map.of("name", "It", "quantity", billed, "price", BigDecimal.ONE);
        return Rate.check(Map.of("name", "A", "currency", "EUR", "quantities", quantities, "lines", List.of(line)))
                .findings()
                .stream()
                .map(Object::toString)
                .toList();
    }

    /** Doubling 15 times is 2^16 clauses and more for each name above; doubling 40 times is 10^12. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({"10, true", "40, false"})
    void namesThatUseTheNextTwiceDoubleEachTime(int names, boolean usable) {
        Map<String, Object> quantities = new LinkedHashMap<>();
        for (int i = 0; i < names; i++) {
            quantities.put("q" + i, Map.of("sum", List.of("q" + (i + 1), "q" + (i + 1))));
        }
        quantities.put("q" + names, Map.of("peak", "kW"));
        assertThat(findings(quantities, "q0")).isEqualTo(usable ? List.of() : List.of(TOO_LARGE));
    }

    @ParameterizedTest
    @CsvSource({"300, false, true", "500, false, false", "500, true, false"})
    void aChainOfNamesMayNotBeTooDeepInEitherOrder(int names, boolean lastFirst, boolean usable) {
        List<Integer> order = new ArrayList<>();
        for (int i = 0; i < names; i++) {
            order.add(lastFirst ? 0 : order.size(), i);
        }
        Map<String, Object> quantities = new LinkedHashMap<>();
        for (int i : order) {
            quantities.put("q" + i, i == names - 1 ? Map.of("peak", "kW") : "q" + (i + 1));
        }
        assertThat(findings(quantities, "q0")).isEqualTo(usable ? List.of() : List.of(TOO_LARGE));
    }

    /** 60 × 60 × 60 months are 216,000 looks back. Own arithmetic. */
    @Test
    void pastsOfPastsOfPastsAreTooMany() {
        Object past = Map.of("peak", "kW");
        for (int i = 0; i < 3; i++) {
            past = Map.of("earlier", "highest", "of", past, "months", BigDecimal.valueOf(60));
        }
        assertThat(findings(Map.of(), past)).containsExactly(TOO_LARGE);
    }

    @Test
    void aListMayNotHaveMoreThanAThousandEntries() {
        List<Object> many = new ArrayList<>();
        for (int i = 0; i <= 1000; i++) {
            many.add(Map.of("peak", "kW"));
        }
        assertThat(findings(Map.of(), Map.of("largest", many)))
                .containsExactly("/lines/0/quantity/largest: has too many entries; found 1001; allowed: at most 1000");
    }
}
