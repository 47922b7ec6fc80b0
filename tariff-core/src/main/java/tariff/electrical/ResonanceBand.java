// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/**
 * How near a harmonic lies to the resonance, by the factor k that its current into the network is lifted. For a plain bank a lift of
 * k or more is the same as {@code √(k/(k+1)) ≤ h_r/h ≤ √(k/(k−1))}. The two factors, 5 and 3, are a convention of this library (own
 * arithmetic, no source).
 */
public enum ResonanceBand {
    LOW(1),
    CAUTION(3),
    DANGER(5);

    private final double factor;

    ResonanceBand(double factor) {
        this.factor = factor;
    }

    /** The least amplification of the band. */
    public double factor() {
        return factor;
    }

    /** The band of an amplification, 0 or more, infinity allowed. */
    public static ResonanceBand of(double amplification) {
        return amplification >= DANGER.factor ? DANGER : amplification >= CAUTION.factor ? CAUTION : LOW;
    }

    /** Least h_r/h of the band of a plain bank, {@code √(k/(k+1))}. */
    public double lowestRatio() {
        return Math.sqrt(factor / (factor + 1));
    }

    /** Greatest h_r/h of the band of a plain bank, {@code √(k/(k−1))}; infinite for {@link #LOW}. */
    public double highestRatio() {
        return Math.sqrt(factor / (factor - 1));
    }
}
