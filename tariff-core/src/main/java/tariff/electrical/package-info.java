// SPDX-License-Identifier: Apache-2.0
/**
 * What the power triangle, the transformer and the capacitor imply. In: pure, cited formulas on numbers, and screens that hold a
 * site and a bank against published limits. Out: money, months, rates, files, and every other package of the project. A screen
 * is an estimate from few numbers, never a design. Start at {@link tariff.electrical.PowerTriangle}, then
 * {@link tariff.electrical.Screens}.
 */
@NullMarked
package tariff.electrical;

import org.jspecify.annotations.NullMarked;
