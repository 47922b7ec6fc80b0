// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

/** What a window makes of the holidays that its rate lists. */
public enum HolidayRule {
    /** A holiday is a day like any other. */
    AS_ITS_WEEKDAY,
    /** A holiday counts as a Sunday. */
    AS_SUNDAY,
    /** The window does not hold on a holiday. */
    EXCLUDED
}
