// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.util.List;

/** Whether a line applies in a month: an object with one of {@code quantity, option, season, not}. */
public sealed interface Condition extends Clause permits HasOption, InSeason, Not, Reaches {

    void check(Scope scope);

    boolean holds(Facts facts);

    /** After "only if": {@code the site is primary metered}. */
    String words();

    /** As the end of a sentence: {@code only if the site is primary metered}. */
    default String ending() {
        return "only if " + words();
    }

    @Override
    default List<? extends Clause> parts() {
        return List.of();
    }

    static Condition read(Written parent, String key) {
        Written in = parent.at(key);
        Condition condition;
        if (in.has("quantity")) {
            condition = Reaches.read(in);
        } else if (in.has("option")) {
            condition = new HasOption(in.text("option"));
        } else if (in.has("season")) {
            condition = new InSeason(in.text("season"));
        } else if (in.has("not")) {
            condition = new Not(read(in, "not"));
        } else {
            in.wrong("condition", "is not a condition", "an object with one of: quantity, option, season, not");
            return new HasOption("?");
        }
        in.refuseOtherKeys();
        return condition;
    }
}
