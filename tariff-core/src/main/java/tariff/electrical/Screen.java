// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import java.util.OptionalDouble;

/** One question asked of every bank. A new one is one new file, and one line in {@link Screens}. */
interface Screen {

    /** What is asked, in trade words. */
    String name();

    /** What the answer is held against. */
    String limit();

    /** Where that is written down, with the edition. */
    String source();

    /** What would settle it. */
    String settledBy();

    /** Asks; data that are missing give {@link Verdict#NOT_SCREENED} and say what is needed. */
    Screening ask(SiteData site, BankData bank);

    /** What the value of an answer counts, such as {@code kVA}. */
    String unit();

    /** An answer with its figure. */
    default Screening answer(Verdict verdict, double value, String found) {
        return answer(verdict, OptionalDouble.of(value), found);
    }

    /** An answer that only says what is needed. */
    default Screening notScreened(Needs needs) {
        return answer(Verdict.NOT_SCREENED, OptionalDouble.empty(), needs.toString());
    }

    /** An answer with this screen's own name, unit, limit and source. */
    default Screening answer(Verdict verdict, OptionalDouble value, String found) {
        return new Screening(name(), verdict, found, value, unit(), limit(), source(), settledBy());
    }
}
