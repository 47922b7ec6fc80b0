// SPDX-License-Identifier: Apache-2.0
/**
 * Reading interval data as meters give them. In: stamps, separators, decimals, and everything that can be wrong with a file.
 * Out: what is done with the figures afterwards. Start at {@link tariff.intervalfile.IntervalFile}.
 */
@NullMarked
package tariff.intervalfile;

import org.jspecify.annotations.NullMarked;
