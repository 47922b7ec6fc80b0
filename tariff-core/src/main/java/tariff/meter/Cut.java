// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

/** Into what a period is cut when a rate asks for the same quantity inside each hour or day. */
public enum Cut {
    QUARTER_HOURS("quarter hours", 15),
    HALF_HOURS("half hours", 30),
    HOURS("hours", 60),
    /** By the local clock: 23 or 25 hours when daylight saving begins or ends. */
    DAYS("days", 24 * 60);

    private final String words;
    private final int minutes;

    Cut(String words, int minutes) {
        this.words = words;
        this.minutes = minutes;
    }

    public String words() {
        return words;
    }

    /** Minutes of one, of a day without daylight saving. */
    public int minutes() {
        return minutes;
    }
}
