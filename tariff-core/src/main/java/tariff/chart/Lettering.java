// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;

/** Room that words take. Estimated from above for the usual sans-serif faces, because the reader's face is not known. */
final class Lettering {
    static final int SMALL = 11;
    static final int PLAIN = 12;
    static final int TITLE = 16;

    private static final String NARROW = "iljtfrI.,:;|!'()[] ";
    private static final String WIDE = "mwMWGOQ@%&";

    private Lettering() {}

    /** px that a line of words takes at most, at a size in px. */
    static double width(String words, int size) {
        return size * words.codePoints().mapToDouble(Lettering::ems).sum();
    }

    private static double ems(int point) {
        if (NARROW.indexOf(point) >= 0) {
            return 0.42;
        }
        if (WIDE.indexOf(point) >= 0) {
            return 1;
        }
        if (point > 0x2E80) {
            return 1.05;
        }
        return Character.isUpperCase(point) ? 0.74 : 0.645;
    }

    /** Words broken into lines that fit; a word longer than a line is broken too. */
    static List<String> wrapped(String words, double width, int size) {
        List<String> lines = new ArrayList<>();
        String line = "";
        for (String word : words.strip().split("\\s+", -1)) {
            String longer = line.isEmpty() ? word : line + " " + word;
            if (width(longer, size) <= width) {
                line = longer;
                continue;
            }
            if (!line.isEmpty()) {
                lines.add(line);
            }
            line = word;
            while (width(line, size) > width) {
                int fits = fitting(line, width, size);
                lines.add(line.substring(0, fits));
                line = line.substring(fits);
            }
        }
        lines.add(line);
        return lines;
    }

    private static int fitting(String word, double width, int size) {
        int end = word.offsetByCodePoints(0, 1);
        while (end < word.length()) {
            int next = word.offsetByCodePoints(end, 1);
            if (width(word.substring(0, next), size) > width) {
                break;
            }
            end = next;
        }
        return end;
    }

    /** Words cut to a width, with … where something is missing. */
    static String shortened(String words, double width, int size) {
        return width(words, size) <= width ? words : words.substring(0, fitting(words, width - size, size)) + "…";
    }

    /** Widest line. */
    static double widest(List<String> lines, int size) {
        return lines.stream().mapToDouble(line -> width(line, size)).max().orElse(0);
    }

    /** Heights in the same order, moved down or up as little as a simple sweep can so that neighbours keep their distance. */
    static double[] spread(double[] wanted, double distance, double top, double bottom) {
        Integer[] order = new Integer[wanted.length];
        for (int i = 0; i < order.length; i++) {
            order[i] = i;
        }
        Arrays.sort(order, Comparator.comparingDouble(i -> wanted[i]));
        double[] placed = wanted.clone();
        double free = top;
        for (int i : order) {
            placed[i] = Math.max(placed[i], free);
            free = placed[i] + distance;
        }
        double limit = bottom;
        for (int i = order.length - 1; i >= 0; i--) {
            placed[order[i]] = Math.min(placed[order[i]], limit);
            limit = placed[order[i]] - distance;
        }
        return placed;
    }
}
