// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/**
 * The kvar that a transformer itself draws, which a meter on its supply side counts:
 * {@code Q = S_T (i0 + k² u) / 100}. Source: Electrical Installation Guide, chapter L, compensation of reactive energy absorbed by
 * the transformer.
 */
public final class TransformerReactive {
    private TransformerReactive() {}

    /**
     * Magnetising and load kvar together [kvar].
     *
     * @param transformerKva S_T [kVA], above 0
     * @param magnetisingPercent i0 [%], 0 or more; about 1.8 for older units, 0.3 to 0.8 for modern cores (from memory)
     * @param impedancePercent u [%], 0 or more
     * @param loading k, load over rating, 0 or more
     * @throws IllegalArgumentException outside these ranges
     */
    public static double kvar(
            double transformerKva, double magnetisingPercent, double impedancePercent, double loading) {
        Given.positive("transformerKva", transformerKva, "kVA");
        Given.notNegative("magnetisingPercent", magnetisingPercent, "%");
        Given.notNegative("impedancePercent", impedancePercent, "%");
        Given.notNegative("loading", loading, "of the rating");
        return transformerKva * (magnetisingPercent + loading * loading * impedancePercent) / 100;
    }
}
