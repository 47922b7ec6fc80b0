// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/**
 * IEEE 519 current limits for odd harmonics at the point of common coupling, 120 V to 69 kV [% of the demand current I_L]. Source:
 * IEEE Std 519-1992, table 10-3, as printed in Sankaran, Power Quality in Electrical Systems, fig. 2.3; the same in the 2014 and 2022
 * editions, whose rules for even harmonics differ. It binds the site as a whole, never one machine.
 */
public enum HarmonicCurrentLimit {
    BELOW_20(20, 4.0, 2.0, 1.5, 0.6, 0.3, 5.0),
    FROM_20(50, 7.0, 3.5, 2.5, 1.0, 0.5, 8.0),
    FROM_50(100, 10.0, 4.5, 4.0, 1.5, 0.7, 12.0),
    FROM_100(1000, 12.0, 5.5, 5.0, 2.0, 1.0, 15.0),
    ABOVE_1000(Double.POSITIVE_INFINITY, 15.0, 7.0, 6.0, 2.5, 1.4, 20.0);

    private final double endsAt;
    private final double below11;
    private final double below17;
    private final double below23;
    private final double below35;
    private final double above;
    private final double tdd;

    HarmonicCurrentLimit(
            double endsAt, double below11, double below17, double below23, double below35, double above, double tdd) {
        this.endsAt = endsAt;
        this.below11 = below11;
        this.below17 = below17;
        this.below23 = below23;
        this.below35 = below35;
        this.above = above;
        this.tdd = tdd;
    }

    /**
     * The row for a strength of supply. A ratio on an edge takes the higher row; exactly 1000 still takes the row 100 to 1000.
     *
     * @param faultOverDemand I_sc / I_L, above 0
     * @throws IllegalArgumentException if it is not above 0
     */
    public static HarmonicCurrentLimit at(double faultOverDemand) {
        Given.positive("faultOverDemand", faultOverDemand, "(a ratio)");
        for (HarmonicCurrentLimit row : values()) {
            if (faultOverDemand < row.endsAt || (row == FROM_100 && faultOverDemand == row.endsAt)) {
                return row;
            }
        }
        return ABOVE_1000;
    }

    /** Limit of one odd harmonic [% of I_L]. */
    public double percent(int order) {
        Given.order(order, order >= 3 && order % 2 == 1, "an odd number from 3");
        return order < 11 ? below11 : order < 17 ? below17 : order < 23 ? below23 : order < 35 ? below35 : above;
    }

    /** Limit of the total demand distortion [% of I_L]. */
    public double totalDemandDistortionPercent() {
        return tdd;
    }
}
