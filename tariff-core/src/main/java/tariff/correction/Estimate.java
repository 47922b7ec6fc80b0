// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

/**
 * Which side of what monthly totals leave open. A month's kvarh do not say when they were drawn, so a bank's effect lies between two
 * bounds that both can happen.
 */
public enum Estimate {
    /** The least a bank can save: everything was drawn at the peak. */
    LOW,
    /** An estimate between the bounds, resting on an assumed load curve. */
    CENTRAL,
    /** The most a bank can save: kvarh were drawn evenly. */
    HIGH;

    /** The other side: what is least in one is most in the other. */
    Estimate opposite() {
        return this == LOW ? HIGH : this == HIGH ? LOW : CENTRAL;
    }
}
