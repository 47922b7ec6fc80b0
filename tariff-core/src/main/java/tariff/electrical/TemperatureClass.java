// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/**
 * Highest ambient temperatures of a capacitor [°C]. Source: IEC 60831-1; the maxima as quoted on a page on capacitor life, the means
 * from memory.
 */
public enum TemperatureClass {
    A(40, 30, 20),
    B(45, 35, 25),
    C(50, 40, 30),
    D(55, 45, 35);

    private final int maximum;
    private final int dayMean;
    private final int yearMean;

    TemperatureClass(int maximum, int dayMean, int yearMean) {
        this.maximum = maximum;
        this.dayMean = dayMean;
        this.yearMean = yearMean;
    }

    /** Highest at any time [°C]. */
    public int maximumCelsius() {
        return maximum;
    }

    /** Highest mean over 24 hours [°C]. */
    public int dayMeanCelsius() {
        return dayMean;
    }

    /** Highest mean over a year [°C]. */
    public int yearMeanCelsius() {
        return yearMean;
    }
}
