// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

/** How {@code 1,234} is read. */
public enum DecimalMark {
    COMMA("comma", ','),
    POINT("point", '.');

    private final String word;
    private final char mark;

    DecimalMark(String word, char mark) {
        this.word = word;
        this.mark = mark;
    }

    /** The word that answers the question which mark a file uses: {@code comma}. */
    public String word() {
        return word;
    }

    char mark() {
        return mark;
    }
}
