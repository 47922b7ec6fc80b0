// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

/** Text that fits in 100 columns; what runs on is indented. */
final class Wrapped {
    static final int WIDTH = 100;
    private static final String INDENT = "    ";

    private Wrapped() {}

    /** One paragraph, ended by a line feed; breaks at spaces only. */
    static String text(String paragraph) {
        StringBuilder out = new StringBuilder();
        String words = paragraph.stripLeading();
        StringBuilder line = new StringBuilder(" ".repeat(paragraph.length() - words.length()));
        for (String word : words.split(" ", -1)) {
            if (line.length() > INDENT.length() && line.length() + 1 + word.length() > WIDTH) {
                out.append(line).append('\n');
                line = new StringBuilder(INDENT).append(word);
            } else {
                line.append(line.toString().isBlank() ? "" : " ").append(word);
            }
        }
        return out.append(line).append('\n').toString();
    }
}
