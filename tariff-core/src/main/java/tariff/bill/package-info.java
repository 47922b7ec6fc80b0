// SPDX-License-Identifier: Apache-2.0
/**
 * A rate asked about metered months: statements, and how they agree with what was charged. In: anything worked out from a rate and
 * readings. Out: kinds of clause, banks, file formats. Start at {@link tariff.bill.Billing}.
 */
@NullMarked
package tariff.bill;

import org.jspecify.annotations.NullMarked;
