// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;

/**
 * A table with a caption, heads over its columns and a head before each row. A cell holds one number or one text, a number as
 * spreadsheets read it: no unit, no grouping, a point for the decimals.
 */
final class Table {
    private static final Pattern NUMBER = Pattern.compile("-?\\d+(\\.\\d+)?");

    private static final int SHORT = 24;

    private final String id;
    private final String caption;
    private final List<String> heads;
    private final List<List<String>> rows = new ArrayList<>();

    /**
     * An empty table.
     *
     * @param id differs from every other in the page
     */
    Table(String id, String caption, List<String> heads) {
        this.id = id;
        this.caption = caption;
        this.heads = List.copyOf(heads);
    }

    Table row(List<String> cells) {
        rows.add(List.copyOf(cells));
        return this;
    }

    Table row(String... cells) {
        return row(List.of(cells));
    }

    boolean isEmpty() {
        return rows.isEmpty();
    }

    /** Without the columns that are empty in every row. */
    Table withoutEmptyColumns() {
        List<Integer> kept = new ArrayList<>();
        for (int i = 0; i < heads.size(); i++) {
            int column = i;
            if (rows.stream().anyMatch(row -> !row.get(column).isEmpty())) {
                kept.add(column);
            }
        }
        Table less = new Table(id, caption, kept.stream().map(heads::get).toList());
        rows.forEach(row -> less.row(kept.stream().map(row::get).toList()));
        return less;
    }

    /** A wide table scrolls by itself, also by keyboard; on paper its head is repeated on every sheet. */
    void write(Html page) {
        page.open("div", "class", "wide", "role", "region", "tabindex", "0", "aria-labelledby", id + "-caption");
        page.open("table", "id", id);
        page.text("caption", caption, "id", id + "-caption");
        page.open("thead").open("tr");
        for (int i = 0; i < heads.size(); i++) {
            page.text("th", heads.get(i), "scope", "col", "class", isNumeric(i) ? "number" : "words");
        }
        page.close().close().open("tbody");
        for (List<String> row : rows) {
            page.open("tr");
            page.text("th", row.get(0), "scope", "row", "class", kind(row.get(0)));
            row.stream()
                    .skip(1)
                    .forEach(cell -> page.text("td", cell, "class", isNumber(cell) ? "number" : kind(cell)));
            page.close();
        }
        page.close().close().close();
    }

    /** A short text stays on one line. */
    private static String kind(String cell) {
        return cell.length() <= SHORT ? "short" : "words";
    }

    private boolean isNumeric(int column) {
        return column > 0
                && rows.stream().map(row -> row.get(column)).anyMatch(Table::isNumber)
                && rows.stream().map(row -> row.get(column)).allMatch(cell -> isNumber(cell) || cell.length() <= 3);
    }

    private static boolean isNumber(String cell) {
        return NUMBER.matcher(cell).matches();
    }
}
