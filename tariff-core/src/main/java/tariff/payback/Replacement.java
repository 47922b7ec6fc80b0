// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import java.math.BigDecimal;

/**
 * A later purchase that keeps the bank going, such as contactors or cans.
 *
 * @param year the year of the life at whose end it is paid, from 1
 * @param cost in money of that year, 0 or more; an expense of that year for tax
 */
public record Replacement(int year, BigDecimal cost) {}
