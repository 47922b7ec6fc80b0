// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/** How often capacitors and contactors may be switched. All limits from memory. */
public final class SwitchingLife {
    /** Switchings that a capacitor should see in a year. Source: IEC 60831 type guidance (from memory). */
    public static final double PER_YEAR = 5000;

    /** Operations of a capacitor contactor (AC-6b), the low end of 100 000 to 300 000 (from memory). */
    public static final double CONTACTOR_OPERATIONS = 100_000;

    private SwitchingLife() {}

    /**
     * Operations in a year of 365 days.
     *
     * @param operationsPerDay 0 or more
     * @throws IllegalArgumentException if it is negative
     */
    public static double perYear(double operationsPerDay) {
        return 365 * Given.notNegative("operationsPerDay", operationsPerDay, "a day");
    }

    /** Years that a contactor lasts, infinite at no operation. */
    public static double contactorYears(double operationsPerDay) {
        return CONTACTOR_OPERATIONS / perYear(operationsPerDay);
    }
}
