// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/**
 * How much a bank lifts the voltage at its bus, {@code 100 Q / S} [%]: {@code Q Z% / S_T} behind one transformer. Source:
 * IEEE Std 141, ch. 8 (from memory), and application notes on capacitors and system voltage. Resistance is left out.
 */
public final class VoltageRise {
    private VoltageRise() {}

    /**
     * The rise with the whole bank on [% of the voltage].
     *
     * @param bankKvar effective at the bus [kvar], 0 or more
     * @param shortCircuitKva at the bus [kVA], above 0
     * @throws IllegalArgumentException outside these ranges
     */
    public static double percent(double bankKvar, double shortCircuitKva) {
        return 100
                * Given.notNegative("bankKvar", bankKvar, "kvar")
                / Given.positive("shortCircuitKva", shortCircuitKva, "kVA");
    }
}
