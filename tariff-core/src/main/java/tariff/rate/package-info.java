// SPDX-License-Identifier: Apache-2.0
/**
 * A whole rate: as written, checked, and read back in words. In: what joins clauses into a rate. Out: kinds of clause, months, file
 * formats. Start at {@link tariff.rate.Rate}.
 */
@NullMarked
package tariff.rate;

import org.jspecify.annotations.NullMarked;
