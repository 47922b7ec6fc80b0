// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import tariff.meter.CutEnergies;
import tariff.meter.Unit;

/**
 * An expression over one metered month: what a line bills, where a block ends, what a floor is. A new kind is one new file, and one
 * line in {@link QuantityKinds}.
 */
public sealed interface Quantity extends Clause
        permits Agreed,
                AllOnceAbove,
                AmountOf,
                Constant,
                Days,
                Each,
                Earlier,
                Excess,
                HoursOf,
                Largest,
                Metered,
                Named,
                Priced,
                Prorated,
                Raised,
                Rounded,
                Share,
                Smallest,
                Sum,
                Unreadable {

    /** The unit, empty if it cannot be told because of a finding already made; reports what is wrong to the scope. */
    Optional<Unit> unit(Scope scope);

    /** What it comes to in this month. */
    Figure value(Facts facts);

    /** What it comes to in each part of a period, in whole numbers; empty if it needs decimals. */
    default Optional<Column> column(CutEnergies parts, Facts facts) {
        return Optional.empty();
    }

    /** A noun phrase: {@code 33 % of the kWh}. */
    String words();

    /** Whether its phrase runs on past a noun, so that inside another it needs brackets to be read in one way only. */
    default boolean needsBrackets() {
        return false;
    }

    /** Its phrase as a part of another. */
    default String innerWords() {
        return needsBrackets() ? "(" + words() + ")" : words();
    }

    @Override
    default List<? extends Clause> parts() {
        return List.of();
    }

    /** Stands where a quantity could not be read, so that the rest can still be checked. */
    static Quantity unreadable() {
        return new Unreadable();
    }

    /** For quantities that are simply a number of something. */
    static Quantity constant(String number, Unit unit) {
        return new Constant(new BigDecimal(number), unit);
    }
}
