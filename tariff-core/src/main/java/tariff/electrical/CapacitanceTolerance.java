// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/**
 * How far a capacitor may stand from its rated kvar when new, by standard and edition. The low end belongs to savings, the high
 * end to voltage rise, leading power and resonance. All from memory of the standards, except IEEE Std 18-1992, whose text on
 * capacitance tests gives 100 to 115 %.
 */
public enum CapacitanceTolerance {
    IEC_60831_2014_UP_TO_100_KVAR("IEC 60831-1:2014, up to 100 kvar", 0.95, 1.10),
    IEC_60831_2014_ABOVE_100_KVAR("IEC 60831-1:2014, above 100 kvar", 0.95, 1.05),
    IEC_60831_1996_UNITS("IEC 60831-1:1996, units", 0.95, 1.15),
    IEC_60831_1996_BANKS("IEC 60831-1:1996, banks", 1.00, 1.10),
    IEEE_18_1992("IEEE Std 18-1992", 1.00, 1.15),
    IEEE_18_2012("IEEE Std 18-2012", 1.00, 1.10);

    private final String edition;
    private final double low;
    private final double high;

    CapacitanceTolerance(String edition, double low, double high) {
        this.edition = edition;
        this.low = low;
        this.high = high;
    }

    public String edition() {
        return edition;
    }

    /** Least capacitance over the rated one. */
    public double low() {
        return low;
    }

    /** Greatest capacitance over the rated one. */
    public double high() {
        return high;
    }
}
