// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/**
 * Mean loss over the loss at the peak, from the load factor: {@code k LF + (1 − k) LF²}. The true value always lies between LF² and
 * LF (own arithmetic: Jensen's inequality and the chord). Source: k 0.3 Buller and Woodrow, 0.15 for distribution Gustafson, as
 * quoted in an article on load-loss factors.
 */
public final class LossFactor {
    /** Buller and Woodrow: general loads. */
    public static final double GENERAL = 0.30;

    /** Gustafson: distribution. */
    public static final double DISTRIBUTION = 0.15;

    private LossFactor() {}

    /**
     * The estimate for a load factor, in [LF², LF].
     *
     * @param loadFactor LF, mean over highest demand, in [0, 1]
     * @param weight k in [0, 1]
     * @throws IllegalArgumentException outside these ranges
     */
    public static double of(double loadFactor, double weight) {
        Given.value("loadFactor", loadFactor, loadFactor >= 0 && loadFactor <= 1, "0 to 1");
        Given.value("weight", weight, weight >= 0 && weight <= 1, "0 to 1");
        return weight * loadFactor + (1 - weight) * loadFactor * loadFactor;
    }
}
