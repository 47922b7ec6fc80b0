// SPDX-License-Identifier: Apache-2.0
/**
 * The kinds of clause that rates are made of: quantities, prices, schedules, conditions, lines. In: one file for each kind, which
 * holds how it is written, what is wrong with it, what it comes to and how it reads. Out: a whole rate, a statement, file formats.
 * Start at {@link tariff.rate.clause.Quantity}, then {@link tariff.rate.clause.Share}.
 */
@NullMarked
package tariff.rate.clause;

import org.jspecify.annotations.NullMarked;
