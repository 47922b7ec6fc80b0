// SPDX-License-Identifier: Apache-2.0
/**
 * Bills as people keep them in spreadsheets. In: the text of an exported file, what its headings, numbers and dates can mean,
 * and what was understood. Out: prices, clauses, anything that computes. The only package that knows the CSV library. Start at
 * {@link tariff.csv.BillsFile}.
 */
@NullMarked
package tariff.csv;

import org.jspecify.annotations.NullMarked;
