// SPDX-License-Identifier: Apache-2.0
package tariff.notice;

/**
 * Something a person must know before acting on an answer.
 *
 * @param code a stable word for programs, such as {@code stored-energy}
 * @param message the caution itself
 * @param source where it is written down, or {@code common practice, no source}
 */
public record Caution(String code, String message, String source) {}
