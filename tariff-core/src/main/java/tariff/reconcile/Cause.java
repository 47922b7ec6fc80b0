// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.stream.Stream;

/** A way in which a bill comes about other than by the rate and the readings as they are given. */
interface Cause {

    /** A stable word for programs: {@code power-factor-rounding}. */
    String code();

    /** What could be tried on these bills; nothing where the cause cannot matter. */
    Stream<Trial> trials(Case bills);

    /** Whether it may have happened in some months alone, such as a line left out by mistake. */
    default boolean mayBeOfSingleMonths() {
        return false;
    }
}
