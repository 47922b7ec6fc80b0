// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.List;
import java.util.stream.Stream;

/** The power factor is rounded otherwise than the rate says, or not at all. */
record PowerFactorRounding() implements Cause {
    private static final List<Steps> WAYS = List.of(
            Steps.NONE,
            new Steps("0.01", "halfUp"),
            new Steps("0.001", "halfUp"),
            new Steps("0.0001", "halfUp"),
            new Steps("0.01", "down"),
            new Steps("0.001", "down"));

    @Override
    public String code() {
        return "power-factor-rounding";
    }

    @Override
    public Stream<Trial> trials(Case bills) {
        return WAYS.stream()
                .flatMap(way -> bills.written(
                        this,
                        "the power factor " + way.words(),
                        PowerFactors.changed(bills.source(), rule -> way.under(rule, "round"))));
    }
}
