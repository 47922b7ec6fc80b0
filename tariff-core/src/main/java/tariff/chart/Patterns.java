// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

/** Fills that tell areas apart without colour: one for each series, and a bold diagonal hatch that belongs to none of them. */
final class Patterns {
    private static final double TILE = 10;
    private final Sheet sheet;

    /** Defines as many on a sheet as it needs. */
    Patterns(Sheet sheet, int series) {
        this.sheet = sheet;
        sheet.svg.open("defs");
        for (int i = 0; i < Math.min(series, Ink.count()); i++) {
            define("area" + i, Ink.of(i).tint(), Ink.of(i).pattern(), Ink.of(i).colour(), 1.1);
        }
        define("hatch", "none", "M-1 11L11 -1M-1 1L1 -1M9 11L11 9M-1 6L6 -1M4 11L11 4", Ink.TEXT, 1.3);
        sheet.svg.close();
    }

    private void define(String name, String tint, String path, String colour, double thickness) {
        sheet.svg.open(
                "pattern", "id", sheet.id(name), "width", TILE, "height", TILE, "patternUnits", "userSpaceOnUse");
        sheet.svg.leaf("rect", "width", TILE, "height", TILE, "fill", tint);
        if (!path.isEmpty()) {
            sheet.svg.leaf("path", "d", path, "stroke", colour, "stroke-width", thickness, "fill", "none");
        }
        sheet.svg.close();
    }

    String area(int series) {
        return "url(#" + sheet.id("area" + series % Ink.count()) + ")";
    }

    String hatch() {
        return "url(#" + sheet.id("hatch") + ")";
    }
}
