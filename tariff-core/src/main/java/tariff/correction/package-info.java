// SPDX-License-Identifier: Apache-2.0
/**
 * Capacitor banks and what they do to a year of meter data. In: fixed and stepped banks, walks through an interval series.
 * Out: prices and clauses, and anything that could pass for a design. Start at {@link tariff.correction.BankWalk}.
 */
@NullMarked
package tariff.correction;

import org.jspecify.annotations.NullMarked;
