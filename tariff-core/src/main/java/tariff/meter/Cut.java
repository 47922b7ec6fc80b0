// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

/** Into what a period is cut when a rate asks for the same quantity inside each hour or day. */
public enum Cut {
    QUARTER_HOURS("quarterHour", "quarter-hour", 15),
    HALF_HOURS("halfHour", "half-hour", 30),
    HOURS("hour", "hour", 60),
    /** By the local clock: 23 or 25 hours when daylight saving begins or ends. */
    DAYS("day", "day", 24 * 60);

    private final String key;
    private final String one;
    private final int minutes;

    Cut(String key, String one, int minutes) {
        this.key = key;
        this.one = one;
        this.minutes = minutes;
    }

    /** As files write it. */
    public String key() {
        return key;
    }

    /** The word for one of them. */
    public String one() {
        return one;
    }

    /** The word for several of them. */
    public String words() {
        return one + "s";
    }

    /** Minutes of one, of a day without daylight saving. */
    public int minutes() {
        return minutes;
    }
}
