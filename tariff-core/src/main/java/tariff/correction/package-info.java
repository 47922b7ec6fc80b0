// SPDX-License-Identifier: Apache-2.0
/**
 * What a capacitor bank does to a month or a year: bounds where only totals are known, the exact walk where intervals are. In: banks and
 * readings before and after. Out: money, rates, file formats. Start at {@link tariff.correction.CapacitorBank}, then
 * {@link tariff.correction.BankMonth}.
 */
@NullMarked
package tariff.correction;

import org.jspecify.annotations.NullMarked;
