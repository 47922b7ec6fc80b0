// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

/**
 * Over what time a demand is averaged.
 *
 * @param minutes a divisor of 60, at least the step of the series and a multiple of it
 * @param sliding whether the average moves on by each step of the series; otherwise blocks follow one another from the start of
 *     the period
 */
public record DemandInterval(int minutes, boolean sliding) {
    /** @throws IllegalArgumentException if an hour is not a whole number of such intervals */
    public DemandInterval {
        if (minutes <= 0 || 60 % minutes != 0) {
            throw new IllegalArgumentException("a demand interval of " + minutes + " minutes does not divide an hour");
        }
    }

    public static DemandInterval block(int minutes) {
        return new DemandInterval(minutes, false);
    }

    public static DemandInterval sliding(int minutes) {
        return new DemandInterval(minutes, true);
    }

    /** kW = kWh of the demand interval × this. */
    public int perHour() {
        return 60 / minutes;
    }

    /**
     * How many intervals of the series one demand is averaged over.
     *
     * @throws IllegalArgumentException if it is not a whole number: a series of 60 minutes cannot give a 15-minute demand
     */
    public int stepsIn(IntervalSeries series) {
        if (minutes % series.stepMinutes() != 0) {
            throw new IllegalArgumentException("a series of " + series.stepMinutes()
                    + " minutes cannot give a demand over " + minutes + " minutes");
        }
        return minutes / series.stepMinutes();
    }
}
