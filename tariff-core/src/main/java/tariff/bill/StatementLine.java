// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import java.math.BigDecimal;
import java.util.Optional;
import tariff.rate.clause.Figure;

/**
 * A line of a statement.
 *
 * @param name as the rate names it
 * @param amount rounded as the rate says; zero where the line does not apply
 * @param derivation how the amount came about, before its rounding; empty where the line does not apply
 * @param shownOnly not part of the total
 */
public record StatementLine(String name, BigDecimal amount, Optional<Figure> derivation, boolean shownOnly) {}
