// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

/** Anything a rate is made of. */
public interface Clause {

    /** The clauses written directly inside this one. */
    List<? extends Clause> parts();

    /** The lines of the same month whose amounts this clause itself is worked out from. */
    default List<String> bases() {
        return List.of();
    }

    /** Whether this clause itself depends on the season. */
    default boolean looksAtSeasons() {
        return false;
    }

    /** The power factor from which on this clause itself asks no penalty; empty if it knows none. */
    default Optional<BigDecimal> target() {
        return Optional.empty();
    }

    /** How much of a register this clause itself leaves free; empty if it leaves none. */
    default Optional<Allowance> allowance() {
        return Optional.empty();
    }

    /** This clause and every clause inside it, to any depth. */
    default Stream<Clause> all() {
        return Stream.concat(Stream.of(this), parts().stream().flatMap(Clause::all));
    }

    /**
     * How much of a quantity is free.
     *
     * @param of what is counted
     * @param free up to which nothing is asked for it
     */
    record Allowance(Quantity of, Quantity free) {}
}
