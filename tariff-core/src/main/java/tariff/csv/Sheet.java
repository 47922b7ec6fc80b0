// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.util.ArrayList;
import java.util.List;

/**
 * A table whose lines are months and whose columns are what was noted of them. If the months run across, a line is a column of
 * the file and a column is a row of it; places are always named as the file stands.
 */
record Sheet(List<List<String>> grid, int width, boolean across) {

    static Sheet of(List<List<String>> grid) {
        return new Sheet(grid, grid.stream().mapToInt(List::size).max().orElse(0), false);
    }

    Sheet turned() {
        return new Sheet(grid, width, !across);
    }

    int lines() {
        return across ? width : grid.size();
    }

    int columns() {
        return across ? grid.size() : width;
    }

    /** The trimmed text, empty where the file has no cell. */
    String cell(int line, int column) {
        List<String> row = grid.get(across ? column : line);
        int at = across ? line : column;
        return at < row.size() ? row.get(at) : "";
    }

    List<String> line(int line) {
        List<String> cells = new ArrayList<>();
        for (int column = 0; column < columns(); column++) {
            cells.add(cell(line, column));
        }
        return cells;
    }

    /** {@code row 7, column C (Peak kW)}. */
    String place(int line, int column, String name) {
        return across
                ? columnPlace(column, name) + ", " + linePlace(line)
                : linePlace(line) + ", " + columnPlace(column, name);
    }

    /** {@code row 7}. */
    String linePlace(int line) {
        return across ? "column " + letters(line) : "row " + (line + 1);
    }

    /** {@code column C (Peak kW)}. */
    String columnPlace(int column, String name) {
        return (across ? "row " + (column + 1) : "column " + letters(column))
                + (name.isEmpty() ? "" : " (" + name + ")");
    }

    private static String letters(int index) {
        String tail = String.valueOf((char) ('A' + index % 26));
        return index < 26 ? tail : letters(index / 26 - 1) + tail;
    }
}
