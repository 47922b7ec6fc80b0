// SPDX-License-Identifier: Apache-2.0
/**
 * Charts as SVG files that need nothing else: numbers and words become shapes with patterns, dashes and labels, so that they read
 * without colour, on paper and by screen reader. Drawn by code of our own, because text then stays text, nothing is licensed beside it and
 * the same numbers give the same bytes. In: series of numbers and words. Out: rates, bills, months. Start at {@link
 * tariff.chart.BillChart}.
 */
@NullMarked
package tariff.chart;

import org.jspecify.annotations.NullMarked;
