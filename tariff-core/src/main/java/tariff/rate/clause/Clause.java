// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.util.List;
import java.util.stream.Stream;

/** Anything a rate is made of. */
public interface Clause {

    /** The clauses written directly inside this one. */
    List<? extends Clause> parts();

    /** This clause and every clause inside it, to any depth. */
    default Stream<Clause> all() {
        return Stream.concat(Stream.of(this), parts().stream().flatMap(Clause::all));
    }
}
