// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/**
 * IEEE 519 voltage limits at the point of common coupling [% of nominal]. Source: IEEE Std 519-2014, table 1; up to 1 kV as quoted in
 * a review of that edition, the rest from memory; the 2022 edition was not at hand.
 */
public enum HarmonicVoltageLimit {
    UP_TO_1_KV(1, 5.0, 8.0),
    UP_TO_69_KV(69, 3.0, 5.0),
    UP_TO_161_KV(161, 1.5, 2.5),
    ABOVE_161_KV(Double.POSITIVE_INFINITY, 1.0, 1.5);

    private final double upToKv;
    private final double individual;
    private final double total;

    HarmonicVoltageLimit(double upToKv, double individual, double total) {
        this.upToKv = upToKv;
        this.individual = individual;
        this.total = total;
    }

    /**
     * The row for a nominal voltage; one on an edge takes the lower row.
     *
     * @param kilovolts nominal between lines [kV], above 0
     * @throws IllegalArgumentException if it is not above 0
     */
    public static HarmonicVoltageLimit at(double kilovolts) {
        Given.positive("kilovolts", kilovolts, "kV");
        for (HarmonicVoltageLimit row : values()) {
            if (kilovolts <= row.upToKv) {
                return row;
            }
        }
        return ABOVE_161_KV;
    }

    /** Of any one harmonic [%]. */
    public double individualPercent() {
        return individual;
    }

    /** Of all together [%]. */
    public double totalPercent() {
        return total;
    }
}
