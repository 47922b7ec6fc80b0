// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import tariff.meter.Unit;

/** Quantity × price: {@code { "name": "Energy", "quantity": { "energy": "kWh" }, "price": 0.11 }}, or {@code "blocks"} for a price. */
record Charge(Heading heading, Quantity quantity, Price price) implements Line {

    static Charge read(Written in, Heading heading) {
        Quantity quantity = in.quantity("quantity");
        if (in.has("blocks") && in.has("price")) {
            in.wrong("price", "says both \"price\" and \"blocks\"", "one of the two");
        }
        return new Charge(heading, quantity, in.has("blocks") ? Blocks.read(in) : Price.read(in, "price"));
    }

    @Override
    public void check(Scope scope) {
        Optional<Unit> unit = quantity.unit(scope.at("quantity"));
        price.check(price instanceof Blocks ? scope : scope.at("price"), unit);
    }

    @Override
    public Figure amount(Facts facts) {
        return price.charge(quantity.value(facts), facts);
    }

    @Override
    public String words(Scope scope) {
        Unit unit = quantity.unit(scope.at("quantity")).orElse(Unit.NUMBER);
        String each = unit == Unit.DAYS
                ? "day"
                : unit == Unit.NUMBER ? "period" : unit == Unit.MONEY ? "unit of money" : unit.symbol();
        String what = quantity.words();
        if (quantity instanceof Constant constant
                && unit == Unit.NUMBER
                && constant.number().compareTo(java.math.BigDecimal.ONE) == 0) {
            return price.words(each);
        }
        return what
                + (price instanceof Blocks ? (price.words(each).startsWith("above") ? " " : ": ") : ", at ")
                + price.words(each);
    }

    @Override
    public Optional<String> asksNothing(Set<String> nothing) {
        return price.isFree() ? Optional.of("asks nothing: it has no price but 0") : Optional.empty();
    }

    @Override
    public Optional<Allowance> allowance() {
        return price.freeUpTo().map(free -> new Allowance(quantity, free));
    }

    @Override
    public List<Clause> parts() {
        List<Clause> parts = new ArrayList<>(List.of(quantity, price));
        heading.when().ifPresent(parts::add);
        return parts;
    }
}
