// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/** What a screen makes of a bank at a site. */
public enum Verdict {
    /** Within the limit named, as far as this estimate sees. */
    FINE,
    /** Near a limit, or beyond one that more data may lift. */
    LOOK_CLOSER,
    /** Beyond a limit: not as proposed. */
    STOP,
    /** The data for this screen are missing. It says nothing, least of all that all is well. */
    NOT_SCREENED
}
