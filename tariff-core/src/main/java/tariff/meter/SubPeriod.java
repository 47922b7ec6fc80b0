// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.time.Instant;

/**
 * One hour or day of a period.
 *
 * @param from when it starts
 * @param to when it ends
 * @param registers its own registers, as if it were a period by itself; the period named is the day
 */
public record SubPeriod(Instant from, Instant to, MeteredMonth registers) {}
