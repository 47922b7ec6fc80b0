// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

/**
 * A place on the x axis with words to it.
 *
 * @param place on the x axis
 * @param words that stand above it
 */
public record Flag(double place, String words) {}
