// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

import java.util.List;

/**
 * What tells one series from another: a colour, and, because colour may be lost, a dash and a marker for curves and a pattern for areas.
 * The colours are those of Okabe and Ito, which readers with the usual colour deficiencies tell apart (jfly.uni-koeln.de/color).
 *
 * @param colour of lines
 * @param tint of areas
 * @param dash of lines, in px; "none" for a solid line
 * @param marker path around 0, 0
 * @param pattern path within a tile of 10 × 10 px; empty for a plain tint
 */
record Ink(String colour, String tint, String dash, String marker, String pattern) {
    static final String TEXT = "#1a1a1a";
    static final String FAINT = "#d0d0d0";
    static final String PAPER = "#ffffff";

    private static final String CIRCLE = "M-4 0A4 4 0 1 0 4 0A4 4 0 1 0 -4 0Z";
    private static final String SQUARE = "M-3.5 -3.5H3.5V3.5H-3.5Z";
    private static final String DIAMOND = "M0 -5L5 0L0 5L-5 0Z";
    private static final String TRIANGLE = "M0 -5L4.5 3.5H-4.5Z";

    private static final List<Ink> ALL = List.of(
            new Ink("#0072B2", "#cfe6f5", "none", CIRCLE, ""),
            new Ink("#D55E00", "#fbe0cc", "7 4", SQUARE, "M0 2.5H10M0 7.5H10"),
            new Ink("#009E73", "#d3efe6", "2 3", TRIANGLE, "M2.5 2V3M7.5 7V8M7.5 2V3M2.5 7V8"),
            new Ink("#CC79A7", "#f5e3ed", "10 3 2 3", DIAMOND, "M2.5 0V10M7.5 0V10"),
            new Ink("#E69F00", "#fbeccc", "5 2", CIRCLE, "M0 5H10M5 0V10"),
            new Ink("#56B4E9", "#ddf0fb", "1 2", SQUARE, "M2 5H8M5 2V8"),
            new Ink("#8a6d00", "#fcfad0", "12 4", TRIANGLE, "M0 7L2.5 3L5 7L7.5 3L10 7"),
            new Ink("#555555", "#b8b8b8", "8 2 1 2", DIAMOND, ""));

    /** The ink of a series by its place; after eight they begin again. */
    static Ink of(int series) {
        return ALL.get(series % ALL.size());
    }

    static int count() {
        return ALL.size();
    }
}
