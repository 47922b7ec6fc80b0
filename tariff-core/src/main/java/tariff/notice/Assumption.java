// SPDX-License-Identifier: Apache-2.0
package tariff.notice;

/**
 * Something taken to be so because the data do not say.
 *
 * @param code a stable word for programs, such as {@code peak-kva-derived}
 * @param where the month, line or figure it was used in
 * @param message what was assumed
 * @param remedy what would remove it
 */
public record Assumption(String code, String where, String message, String remedy) {}
