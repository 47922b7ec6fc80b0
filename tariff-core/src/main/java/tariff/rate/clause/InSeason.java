// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;

/** Most of the period lies in a season: {@code { "season": "winter" }}. */
record InSeason(String season) implements Condition {
    private static final BigDecimal HALF = new BigDecimal("0.5");

    @Override
    public void check(Scope scope) {
        if (!scope.names().seasons().contains(season)) {
            scope.at("season").unknown("season", season, scope.names().seasons());
        }
    }

    @Override
    public boolean holds(Facts facts) {
        return facts.seasons().stream()
                .anyMatch(
                        share -> share.season().equals(season) && share.share().compareTo(HALF) > 0);
    }

    @Override
    public boolean looksAtSeasons() {
        return true;
    }

    @Override
    public String words() {
        return "most of the period lies in " + season;
    }
}
