// SPDX-License-Identifier: Apache-2.0
/**
 * What meters gave. In: periods, registers, metered months, interval series and their calendars. Out: prices, clauses, files.
 * Start at {@link tariff.meter.MeteredMonth}.
 */
@NullMarked
package tariff.meter;

import org.jspecify.annotations.NullMarked;
