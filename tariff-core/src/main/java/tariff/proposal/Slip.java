// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

/** A way of claiming too much that has a name. All are common practice, no source. */
public enum Slip {
    COUNTED_TWICE(
            "the same kW or kvar is counted in more than one part: a kVA charge and a power factor penalty on one demand are"
                    + " one charge, not two"),
    UNITY_NOT_PAID("counts the way to unity, but the rate pays only up to its own point"),
    RATCHET_IGNORED(
            "takes a settled year for the first; until the ratchet lets go, the bill remembers the demand from before the bank"),
    UPKEEP_IGNORED("leaves out the upkeep"),
    ON_CLAIMED_SAVINGS("divides the cost by the claimed savings, which do not hold"),
    KWH_FROM_NOWHERE("a bank saves kWh only as heat in the conductors between the meter and itself"),
    KW_NOT_LOWERED("a bank lowers kVA and kvar; it does not lower kW but for the losses before it"),
    DISTORTION_IGNORED("is the power factor of undistorted current; capacitors do not remove the distortion"),
    TOO_FEW_KVAR("needs more kvar than the bank has"),
    RATED_NOT_EFFECTIVE("is the rating at another voltage; kvar go with the square of the voltage");

    private final String words;

    Slip(String words) {
        this.words = words;
    }

    public String words() {
        return words;
    }
}
