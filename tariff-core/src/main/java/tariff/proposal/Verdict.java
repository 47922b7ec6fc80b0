// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.Optional;

/** What there is to say of a claim. */
public sealed interface Verdict {

    /** The sentence, without its full stop. */
    String words();

    /** A stable word for programs, such as {@code beyond-rate}. */
    String kind();

    /** The most that can be claimed, or for a payback the least, where there is such a bound. */
    default Optional<BigDecimal> limit() {
        return Optional.empty();
    }

    /** The bills bear it out. */
    record Holds(String words) implements Verdict {
        @Override
        public String kind() {
            return "holds";
        }
    }

    /** It can be so, but the bills do not say that it is. */
    record HoldsOnlyIf(String words) implements Verdict {
        @Override
        public String kind() {
            return "holds-only-if";
        }
    }

    /**
     * The rate does not pay as much.
     *
     * @param ceiling the most it can give, or for a payback the least
     */
    record BeyondRate(BigDecimal ceiling, String words) implements Verdict {
        @Override
        public String kind() {
            return "beyond-rate";
        }

        @Override
        public Optional<BigDecimal> limit() {
            return Optional.of(ceiling);
        }
    }

    /**
     * Nature does not allow as much.
     *
     * @param bound the most it can give
     */
    record BeyondPhysics(BigDecimal bound, String words) implements Verdict {
        @Override
        public String kind() {
            return "beyond-physics";
        }

        @Override
        public Optional<BigDecimal> limit() {
            return Optional.of(bound);
        }
    }

    /**
     * These data cannot tell.
     *
     * @param wouldTell what would
     */
    record CannotTell(String wouldTell) implements Verdict {
        @Override
        public String kind() {
            return "cannot-tell";
        }

        @Override
        public String words() {
            return "cannot be told from these data; " + wouldTell + " would tell";
        }
    }
}
