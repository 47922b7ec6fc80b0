// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.math.BigDecimal;
import java.util.Optional;

/**
 * One column's name and what it was taken to mean.
 *
 * @param name as written
 * @param factor what a figure is multiplied by, 1000 for MWh
 * @param percent whether the name says per cent
 * @param rank 0 for a name that says just this; the higher, the sooner another column is preferred
 * @param remark what a person should know of the reading, if anything
 */
record Heading(String name, Meaning meaning, BigDecimal factor, boolean percent, int rank, Optional<Remark> remark) {

    /** Something doubtful about a name. */
    record Remark(String code, String message, boolean isError) {}

    static Heading of(String name, Meaning meaning) {
        return new Heading(name, meaning, BigDecimal.ONE, false, 0, Optional.empty());
    }

    static Heading ignored(String name, String reason) {
        return of(name, new Meaning.Ignored(reason));
    }

    static Heading doubtful(String name, String reason) {
        return ignored(name, reason).remark("column-not-used", "is not used: " + reason);
    }

    Heading meaning(Meaning newMeaning) {
        return new Heading(name, newMeaning, factor, percent, rank, remark);
    }

    Heading factor(BigDecimal newFactor) {
        return new Heading(name, meaning, newFactor, percent, rank, remark);
    }

    Heading percent(boolean newPercent) {
        return new Heading(name, meaning, factor, newPercent, rank, remark);
    }

    Heading rank(int newRank) {
        return new Heading(name, meaning, factor, percent, newRank, remark);
    }

    Heading remark(String code, String message) {
        return new Heading(name, meaning, factor, percent, rank, Optional.of(new Remark(code, message, false)));
    }

    Heading error(String code, String message) {
        return new Heading(name, meaning, factor, percent, rank, Optional.of(new Remark(code, message, true)));
    }
}
