// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/**
 * The share of a site's kWh that a bank can credibly save: the loss between meter and bank that depends on load, times the cut of
 * {@link SeriesLosses#cutPercent}. Loss shares by place and both limits are common practice, no source; cables 1 to 4 % and
 * transformers 0.4 to 1.9 % at full load bound them, IEEE Std 3001.5-2013, table 1.
 */
public final class KwhShare {
    /** A claim above this share of kWh deserves a question [%]. */
    public static final double DOUBTFUL_PERCENT = 1;

    /** A claim above this share of kWh is beyond what resistance explains [%]. */
    public static final double INCREDIBLE_PERCENT = 3;

    /** Where the bank stands, seen from the meter, with the loss usually found between [% of kWh]. */
    public enum Place {
        AT_THE_METER(0),
        BEHIND_OWN_TRANSFORMER(1),
        AT_THE_LOAD(2);

        private final double lossPercent;

        Place(double lossPercent) {
            this.lossPercent = lossPercent;
        }

        public double lossPercent() {
            return lossPercent;
        }
    }

    private KwhShare() {}

    /**
     * {@code ℓ (1 − (PF1/PF2)²)} [% of kWh].
     *
     * @param lossPercent ℓ, loss between meter and bank that depends on load [% of kWh], in [0, 100]
     * @throws IllegalArgumentException outside that range or if a power factor is outside (0, 1]
     */
    public static double savedPercent(double lossPercent, double presentPf, double newPf) {
        Given.value("lossPercent", lossPercent, lossPercent >= 0 && lossPercent <= 100, "0 to 100 %");
        return lossPercent * SeriesLosses.cutPercent(presentPf, newPf) / 100;
    }
}
