// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import tariff.chart.Markup;

/** Writes HTML elements, one a line, so closed that XML readers follow them too. Words and values of attributes are escaped; attributes come in pairs of name and value. */
final class Html {
    private final StringBuilder out = new StringBuilder("<!DOCTYPE html>\n");
    private final Deque<String> open = new ArrayDeque<>();

    Html open(String element, String... attributes) {
        out.append(start(element, attributes)).append('\n');
        open.push(element);
        return this;
    }

    Html close() {
        out.append("</").append(open.pop()).append(">\n");
        return this;
    }

    /** An element without content or end, such as {@code meta}. */
    Html single(String element, String... attributes) {
        String tag = start(element, attributes);
        out.append(tag, 0, tag.length() - 1).append(" />\n");
        return this;
    }

    Html text(String element, String words, String... attributes) {
        out.append(start(element, attributes))
                .append(Markup.escaped(words))
                .append("</")
                .append(element)
                .append(">\n");
        return this;
    }

    Html paragraph(String words) {
        return text("p", words);
    }

    /** A list of one kind, {@code ul} or {@code ol}; nothing for no entries. */
    Html list(String kind, List<String> entries) {
        if (entries.isEmpty()) {
            return this;
        }
        open(kind);
        entries.forEach(each -> text("li", each));
        return close();
    }

    /** Words that stand beside elements within the one that is open. */
    Html words(String words) {
        out.append(Markup.escaped(words)).append('\n');
        return this;
    }

    /** Markup made elsewhere in this program: a drawing, a style sheet. Never anything that was given from outside. */
    Html markup(String made) {
        out.append(made);
        return this;
    }

    private static String start(String element, String... attributes) {
        StringBuilder tag = new StringBuilder("<").append(element);
        for (int i = 0; i < attributes.length; i += 2) {
            tag.append(' ')
                    .append(attributes[i])
                    .append("=\"")
                    .append(Markup.escaped(attributes[i + 1]))
                    .append('"');
        }
        return tag.append('>').toString();
    }

    @Override
    public String toString() {
        return out.toString();
    }
}
