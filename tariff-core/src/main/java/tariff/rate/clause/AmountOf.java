// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import tariff.meter.Unit;

/** What other lines come to, as a quantity: {@code { "amount": [ "Energy", "Demand" ] }}. */
record AmountOf(List<String> lines) implements Quantity {

    static Quantity read(Written in) {
        return new AmountOf(in.texts("amount"));
    }

    @Override
    public Optional<Unit> unit(Scope scope) {
        for (int i = 0; i < lines.size(); i++) {
            LineNames.check(lines.get(i), scope.at("amount").at(i));
        }
        return Optional.of(Unit.MONEY);
    }

    @Override
    public Figure value(Facts facts) {
        BigDecimal total = BigDecimal.ZERO;
        for (String line : lines) {
            total = total.add(facts.amount(line));
        }
        return Figure.given(total, Unit.MONEY, String.join(" + ", lines));
    }

    @Override
    public List<String> bases() {
        return lines;
    }

    @Override
    public String words() {
        return "the amount of " + String.join(" and ", lines);
    }
}
