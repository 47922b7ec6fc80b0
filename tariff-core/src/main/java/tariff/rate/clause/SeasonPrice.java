// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import tariff.meter.Unit;

/** A price for each of the rate's seasons: {@code { "bySeason": { "summer": 13.10, "winter": 11.40 } }}. */
record SeasonPrice(Map<String, BigDecimal> prices) implements Price {

    SeasonPrice {
        prices = Collections.unmodifiableMap(new LinkedHashMap<>(prices));
    }

    static SeasonPrice read(Written in) {
        return new SeasonPrice(in.named("bySeason", Written::number));
    }

    @Override
    public void check(Scope scope, Optional<Unit> unit) {
        Scope here = scope.at("bySeason");
        for (String season : prices.keySet()) {
            if (!scope.names().seasons().contains(season)) {
                here.at(season).unknown("season", season, scope.names().seasons());
            }
        }
        for (String season : scope.names().seasons()) {
            if (!prices.containsKey(season)) {
                here.error("season-price", "gives no price for the season \"" + season + "\"");
            }
        }
    }

    @Override
    public Figure charge(Figure quantity, Facts facts) {
        BigDecimal price = BigDecimal.ZERO;
        for (Facts.SeasonShare season : facts.seasons()) {
            price = price.add(
                    prices.getOrDefault(season.season(), BigDecimal.ZERO).multiply(season.share()));
        }
        String names = facts.seasons().stream().map(Facts.SeasonShare::season).collect(Collectors.joining(" and "));
        return Figure.of(
                quantity.value().multiply(price),
                Unit.MONEY,
                "{} × {} (" + names + ")",
                quantity,
                Figure.number(price));
    }

    @Override
    public String words(String unit) {
        return prices.entrySet().stream()
                .map(price -> Decimals.plain(price.getValue()) + " per " + unit + " in " + price.getKey())
                .collect(Collectors.joining(", "));
    }

    @Override
    public boolean looksAtSeasons() {
        return true;
    }

    @Override
    public boolean isFree() {
        return prices.values().stream().allMatch(price -> price.signum() == 0);
    }
}
