// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

/** Apparent from active and reactive, in whole units. */
public final class Apparent {
    /** Below this the squares of two numbers add up within a long. */
    private static final long SQUARES_FIT = 1L << 31;

    private Apparent() {}

    /** Whether P² + Q² fits a long. */
    public static boolean squaresFit(long active, long reactive) {
        return active < SQUARES_FIT && Math.abs(reactive) < SQUARES_FIT;
    }

    /**
     * S = √(P² + Q²), rounded half up to a whole unit; exact to that rounding.
     *
     * @param active P in any unit, such as 10<sup>−6</sup> kW, below 2<sup>55</sup> in size
     * @param reactive Q in the same unit and range, of either sign
     */
    public static long of(long active, long reactive) {
        double p = active;
        double q = reactive;
        long root = (long) Math.sqrt(p * p + q * q);
        // The squares may overflow, but their difference is small and therefore survives the overflow exactly.
        long rest = active * active + reactive * reactive - root * root;
        while (rest < 0) {
            rest += 2 * root - 1;
            root--;
        }
        while (rest > 2 * root) {
            rest -= 2 * root + 1;
            root++;
        }
        return rest > root ? root + 1 : root;
    }
}
