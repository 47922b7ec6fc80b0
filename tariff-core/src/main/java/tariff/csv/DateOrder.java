// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

/** How {@code 03/04/2026} is read. */
public enum DateOrder {
    DAY_FIRST("day-first"),
    MONTH_FIRST("month-first");

    private final String word;

    DateOrder(String word) {
        this.word = word;
    }

    /** The word that answers the question which order a file uses: {@code day-first}. */
    public String word() {
        return word;
    }

    DateOrder other() {
        return this == DAY_FIRST ? MONTH_FIRST : DAY_FIRST;
    }
}
