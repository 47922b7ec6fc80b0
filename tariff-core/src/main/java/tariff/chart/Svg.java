// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

import java.util.ArrayDeque;
import java.util.Deque;

/** Writes SVG elements, one a line, indented, escaped. Attributes come in pairs of name and value; numbers get two decimals at most. */
final class Svg {
    private final StringBuilder out = new StringBuilder();
    private final Deque<String> open = new ArrayDeque<>();

    Svg open(String element, Object... attributes) {
        line(start(element, attributes) + ">");
        open.push(element);
        return this;
    }

    Svg close() {
        String element = open.pop();
        line("</" + element + ">");
        return this;
    }

    Svg leaf(String element, Object... attributes) {
        line(start(element, attributes) + "/>");
        return this;
    }

    Svg text(String words, String element, Object... attributes) {
        line(start(element, attributes) + ">" + Markup.escaped(words) + "</" + element + ">");
        return this;
    }

    private static String start(String element, Object... attributes) {
        StringBuilder tag = new StringBuilder("<").append(element);
        for (int i = 0; i < attributes.length; i += 2) {
            Object value = attributes[i + 1];
            String written = value instanceof Double number ? Numbers.coordinate(number) : String.valueOf(value);
            tag.append(' ')
                    .append(attributes[i])
                    .append("=\"")
                    .append(Markup.escaped(written))
                    .append('"');
        }
        return tag.toString();
    }

    private void line(String text) {
        out.append("  ".repeat(open.size())).append(text).append('\n');
    }

    @Override
    public String toString() {
        return out.toString();
    }
}
