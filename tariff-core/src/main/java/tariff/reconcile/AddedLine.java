// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import tariff.rate.RateSource;

/** A line put under those that a rate has. */
final class AddedLine {
    private static final String NAME = "(a line that the rate does not have)";

    private AddedLine() {}

    static RateSource percentage(RateSource source, BigDecimal percent) {
        return under(source, Map.of("name", NAME, "percentOf", "all above", "percent", percent));
    }

    static RateSource amount(RateSource source, BigDecimal amount) {
        return under(source, Map.of("name", NAME, "quantity", Map.of("constant", BigDecimal.ONE), "price", amount));
    }

    private static RateSource under(RateSource source, Map<String, Object> line) {
        List<Object> lines = new ArrayList<>();
        if (source.tree().get("lines") instanceof List<?> old) {
            lines.addAll(old);
        }
        lines.add(line);
        return source.with("lines", lines);
    }
}
