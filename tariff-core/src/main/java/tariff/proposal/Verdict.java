// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;

/** What there is to say of a claim. */
public sealed interface Verdict {

    /** The sentence, without its full stop. */
    String words();

    /** The bills bear it out. */
    record Holds(String words) implements Verdict {}

    /** It can be so, but the bills do not say that it is. */
    record HoldsOnlyIf(String words) implements Verdict {}

    /**
     * The rate does not pay as much.
     *
     * @param ceiling the most it can give, or for a payback the least
     */
    record BeyondRate(BigDecimal ceiling, String words) implements Verdict {}

    /**
     * Nature does not allow as much.
     *
     * @param bound the most it can give
     */
    record BeyondPhysics(BigDecimal bound, String words) implements Verdict {}

    /**
     * These data cannot tell.
     *
     * @param wouldTell what would
     */
    record CannotTell(String wouldTell) implements Verdict {
        @Override
        public String words() {
            return "cannot be told from these data; " + wouldTell + " would tell";
        }
    }
}
