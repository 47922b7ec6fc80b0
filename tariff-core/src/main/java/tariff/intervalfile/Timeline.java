// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.time.ZoneId;

/**
 * When each row's interval begins.
 *
 * @param starts minutes since 1970 (UTC), in the order of the rows
 * @param locals the stamps as written, for messages: minutes since 1970 by their own clock
 * @param stepMinutes 5, 10, 15, 30 or 60
 * @param zone the clock of the bill
 */
@SuppressWarnings("ArrayRecordComponent")
record Timeline(long[] starts, long[] locals, int stepMinutes, ZoneId zone) {}
