// SPDX-License-Identifier: Apache-2.0
/**
 * Bills already paid, held against a rate: what is doubtful about them, where they agree, and what would make the others agree. In:
 * comparisons, and causes as changes to a rate or a month that the same engine bills again. Out: how a bill is worked out, banks, file
 * formats. Start at {@link tariff.reconcile.Reconciliation}.
 */
@NullMarked
package tariff.reconcile;

import org.jspecify.annotations.NullMarked;
