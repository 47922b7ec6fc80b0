// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.util.List;

/**
 * A quantity reaches a limit ({@code { "quantity": …, "reaches": … }}, equal counts) or exceeds it ({@code "exceeds"}, equal does not).
 */
record Reaches(Quantity quantity, Quantity limit, boolean orEqual) implements Condition {

    static Reaches read(Written in) {
        boolean exceeds = in.has("exceeds");
        if (exceeds && in.has("reaches")) {
            in.wrong("condition", "says both \"reaches\" and \"exceeds\"", "one of the two");
        }
        return new Reaches(in.quantity("quantity"), in.quantity(exceeds ? "exceeds" : "reaches"), !exceeds);
    }

    @Override
    public void check(Scope scope) {
        scope.at(orEqual ? "reaches" : "exceeds")
                .expect(limit, quantity.unit(scope.at("quantity")), "the quantity is in");
    }

    @Override
    public boolean holds(Facts facts) {
        int side = quantity.value(facts).value().compareTo(limit.value(facts).value());
        return orEqual ? side >= 0 : side > 0;
    }

    @Override
    public String words() {
        return quantity.words() + (orEqual ? " is at least " : " is above ") + limit.words();
    }

    @Override
    public List<Clause> parts() {
        return List.of(quantity, limit);
    }
}
