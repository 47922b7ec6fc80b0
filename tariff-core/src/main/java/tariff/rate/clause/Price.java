// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.util.List;
import java.util.Optional;
import tariff.meter.Unit;

/** What is asked for each unit of a quantity: a number, or an object with one of {@code bySeason, byDate, bySchedule, blocks}. */
public sealed interface Price extends Clause permits Blocks, DatedPrice, FixedPrice, SchedulePrice, SeasonPrice {

    /** Reports what is wrong, for a quantity of this unit. */
    void check(Scope scope, Optional<Unit> unit);

    /** The money for a quantity. */
    Figure charge(Figure quantity, Facts facts);

    /** As a phrase, with the word for one unit: {@code 0.0420 per kvarh}. */
    String words(String unit);

    /** Up to where nothing is asked; empty if the first unit costs something. */
    default Optional<Quantity> freeUpTo() {
        return Optional.empty();
    }

    /** Whether it is nothing, whatever the month. */
    boolean isFree();

    @Override
    default List<? extends Clause> parts() {
        return List.of();
    }

    static Price read(Written parent, String key) {
        if (!parent.has(key)) {
            parent.number(key);
            return new FixedPrice(java.math.BigDecimal.ONE);
        }
        return read(parent.at(key));
    }

    private static Price read(Written in) {
        if (!in.isObject()) {
            return new FixedPrice(in.number());
        }
        Price price;
        if (in.has("bySeason")) {
            price = SeasonPrice.read(in);
        } else if (in.has("byDate")) {
            price = DatedPrice.read(in);
        } else if (in.has("bySchedule")) {
            price = new SchedulePrice(Schedule.read(in, "bySchedule"));
        } else if (in.has("blocks")) {
            price = Blocks.read(in);
        } else {
            in.wrong(
                    "price",
                    "is not a price",
                    "a number, or an object with one of: bySeason, byDate, bySchedule, blocks");
            return new FixedPrice(java.math.BigDecimal.ONE);
        }
        in.refuseOtherKeys();
        return price;
    }
}
