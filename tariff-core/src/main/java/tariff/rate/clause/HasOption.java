// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

/** Something holds for the site, by the rate's own word: {@code { "option": "primary metered" }}. */
record HasOption(String option) implements Condition {

    @Override
    public void check(Scope scope) {}

    @Override
    public boolean holds(Facts facts) {
        return facts.option(option);
    }

    @Override
    public String words() {
        return "the site is marked \"" + option + "\"";
    }
}
