// SPDX-License-Identifier: Apache-2.0
/**
 * Money in time: what a bank costs, what it saves month by month, and when it has paid for itself. In: cash flows, discounting,
 * and the measures drawn from them, each with its convention. Out: rates, bills, where the savings come from, rounding for
 * display. Start at {@link tariff.payback.Venture}, then {@link tariff.payback.Appraisal}.
 *
 * <p>Every rate, share and escalation is a fraction of one: 0.08 is 8 %. Amounts are in one currency and are not rounded; divisions
 * and discounting carry 34 significant digits ({@link java.math.MathContext#DECIMAL128}). Month 0 is the day the bank is paid for;
 * month n falls at the end of the nth month after it, year n at the end of month 12 n.
 */
@NullMarked
package tariff.payback;

import org.jspecify.annotations.NullMarked;
