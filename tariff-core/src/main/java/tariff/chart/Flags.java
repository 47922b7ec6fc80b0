// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import tariff.chart.Sheet.Anchor;

/** Flags above a frame, in as many rows as they need so that no words meet. The leftmost stand highest. */
final class Flags {
    private static final double ROW = 16;
    private static final double GAP = 5;
    private static final double WIDEST = 420;

    private record Placed(double x, String words, boolean leftOfPole, int row) {
        double from() {
            return leftOfPole ? x - GAP - width() : x + GAP;
        }

        double to() {
            return from() + width();
        }

        private double width() {
            return Lettering.width(words, Lettering.PLAIN);
        }

        boolean meets(Placed other) {
            return row == other.row && from() < other.to() + GAP && other.from() < to() + GAP;
        }
    }

    private final List<Placed> placed = new ArrayList<>();
    private int rows;

    /**
     * Finds a place for each.
     *
     * @param flags with places in px
     * @param right where the sheet ends
     */
    Flags(List<Flag> flags, double right) {
        List<Flag> fromTheRight = flags.stream()
                .sorted(Comparator.comparingDouble(Flag::place).reversed())
                .toList();
        for (Flag flag : fromTheRight) {
            String words = Lettering.shortened(flag.words(), WIDEST, Lettering.PLAIN);
            boolean tooFarRight = flag.place() + GAP + Lettering.width(words, Lettering.PLAIN) > right;
            int row = 0;
            while (meets(new Placed(flag.place(), words, tooFarRight, row))) {
                row++;
            }
            placed.add(new Placed(flag.place(), words, tooFarRight, row));
            rows = Math.max(rows, row + 1);
        }
    }

    private boolean meets(Placed one) {
        return placed.stream().anyMatch(one::meets);
    }

    /** px that they take above the frame. */
    double height() {
        return rows * ROW;
    }

    void drawPoles(Sheet sheet, double top, double bottom) {
        for (Placed flag : placed) {
            sheet.line(flag.x, top - flag.row * ROW - ROW, flag.x, bottom, Ink.TEXT, 1, "2 3");
        }
    }

    void drawWords(Sheet sheet, double top) {
        for (Placed flag : placed) {
            double y = top - flag.row * ROW - 5;
            sheet.rect(flag.from() - 2, y - 11, flag.width() + 2, ROW - 2, Ink.PAPER, "none");
            sheet.text(flag.from(), y, Lettering.PLAIN, Anchor.START, flag.words);
        }
    }
}
