// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

/** A part of a month in which some rates count by itself. */
public enum Span {
    QUARTER_HOUR("quarterHour", "quarter-hour", 15),
    HALF_HOUR("halfHour", "half-hour", 30),
    HOUR("hour", "hour", 60),
    DAY("day", "day", 24 * 60);

    private final String key;
    private final String words;
    private final int minutes;

    Span(String key, String words, int minutes) {
        this.key = key;
        this.words = words;
        this.minutes = minutes;
    }

    /** As a rate file writes it. */
    public String key() {
        return key;
    }

    public String words() {
        return words;
    }

    /** Its length; a day's is nominal, as clocks change. */
    public int minutes() {
        return minutes;
    }
}
