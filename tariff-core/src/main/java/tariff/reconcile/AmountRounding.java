// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.math.BigDecimal;
import java.util.List;
import java.util.stream.Stream;
import tariff.rate.RateSource;

/** Lines or the total are rounded otherwise than the rate says. */
record AmountRounding() implements Cause {
    private static final String LINES = "roundLines";
    private static final List<Steps> OF_LINES =
            List.of(Steps.NONE, new Steps("0.01", "halfUp"), new Steps("0.01", "down"), new Steps("1", "halfUp"));
    private static final List<Steps> OF_TOTAL = List.of(
            new Steps("0.01", "halfUp"),
            new Steps("0.01", "down"),
            new Steps("0.05", "halfUp"),
            new Steps("0.1", "halfUp"),
            new Steps("1", "halfUp"),
            new Steps("1", "down"));

    @Override
    public String code() {
        return "amount-rounding";
    }

    @Override
    public Stream<Trial> trials(Case bills) {
        if (!isSmall(bills)) {
            return Stream.empty();
        }
        Stream<Trial> lines = OF_LINES.stream()
                .flatMap(way -> bills.written(this, "each line " + way.words(), lines(bills.source(), way)));
        Stream<Trial> total = OF_TOTAL.stream()
                .flatMap(way -> bills.written(
                        this,
                        "the total " + way.words(),
                        new RateSource(way.under(bills.source().tree(), "roundTotal"))));
        return Stream.concat(lines, total);
    }

    /** Rounding to a whole unit moves no line by more than one, and what is worked out from it by little more. */
    private static boolean isSmall(Case bills) {
        BigDecimal most = BigDecimal.valueOf(2L * (bills.rate().lines().size() + 1));
        return bills.charged().values().stream()
                .anyMatch(month ->
                        month.distance().signum() > 0 && month.distance().compareTo(most) <= 0);
    }

    private static RateSource lines(RateSource source, Steps way) {
        return way.isNone() ? source.with(LINES, "not") : new RateSource(way.under(source.tree(), LINES));
    }
}
