// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/** Short-circuit power at a bus [kVA]. Source: per-unit arithmetic of IEC 60909 and IEEE Std 141 (from memory), voltage factor 1. */
public final class ShortCircuit {
    private ShortCircuit() {}

    /**
     * Behind one transformer on a source without impedance, {@code S = 100 S_T / Z%} [kVA].
     *
     * @param transformerKva S_T, above 0
     * @param impedancePercent Z on the transformer's own rating, in (0, 100]
     * @throws IllegalArgumentException outside these ranges
     */
    public static double behindTransformerKva(double transformerKva, double impedancePercent) {
        Given.positive("transformerKva", transformerKva, "kVA");
        Given.value(
                "impedancePercent",
                impedancePercent,
                impedancePercent > 0 && impedancePercent <= 100,
                "above 0, up to 100 %");
        return 100 * transformerKva / impedancePercent;
    }

    /**
     * Behind one transformer with the network's own level counted, {@code 1 / (Z/(100 S_T) + 1/S_network)} [kVA].
     *
     * @param networkKva level on the transformer's supply side [kVA], above 0
     */
    public static double behindTransformerKva(double transformerKva, double impedancePercent, double networkKva) {
        return 1
                / (1 / behindTransformerKva(transformerKva, impedancePercent)
                        + 1 / Given.positive("networkKva", networkKva, "kVA"));
    }

    /** From a fault current, {@code √3 U I} [kVA]. */
    public static double fromFaultKva(double lineVolts, double faultKiloamps) {
        return Math.sqrt(3)
                * Given.positive("lineVolts", lineVolts, "V")
                * Given.positive("faultKiloamps", faultKiloamps, "kA");
    }
}
