// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.util.List;

/** A condition does not hold: {@code { "not": { "option": "primary metered" } }}. */
record Not(Condition condition) implements Condition {

    @Override
    public void check(Scope scope) {
        condition.check(scope.at("not"));
    }

    @Override
    public boolean holds(Facts facts) {
        return !condition.holds(facts);
    }

    @Override
    public String ending() {
        return "unless " + condition.words();
    }

    @Override
    public String words() {
        return "it is not so that " + condition.words();
    }

    @Override
    public List<Clause> parts() {
        return List.of(condition);
    }
}
