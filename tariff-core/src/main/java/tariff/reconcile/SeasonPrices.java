// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.Map;
import java.util.stream.Stream;

/** Prices of another season are billed. */
record SeasonPrices() implements Cause {
    private static final String BY_SEASON = "bySeason";

    @Override
    public String code() {
        return "season-prices";
    }

    @Override
    public boolean mayBeOfSingleMonths() {
        return true;
    }

    @Override
    public Stream<Trial> trials(Case bills) {
        return bills.rate().definition().seasons().keySet().stream()
                .flatMap(season -> bills.rewritten(
                        this,
                        "the prices of \"" + season + "\"",
                        value -> value instanceof Map<?, ?> price ? of(season, price) : value));
    }

    private static Object of(String season, Map<?, ?> price) {
        return Keys.get(price, BY_SEASON)
                .filter(Map.class::isInstance)
                .flatMap(prices -> Keys.get((Map<?, ?>) prices, season))
                .orElse(price);
    }
}
