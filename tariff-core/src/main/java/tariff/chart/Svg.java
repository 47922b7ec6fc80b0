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
        line(start(element, attributes) + ">" + escaped(words) + "</" + element + ">");
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
                    .append(escaped(written))
                    .append('"');
        }
        return tag.toString();
    }

    private void line(String text) {
        out.append("  ".repeat(open.size())).append(text).append('\n');
    }

    /** What XML 1.0 reserves becomes an entity, what it forbids a replacement character. */
    static String escaped(String words) {
        StringBuilder safe = new StringBuilder();
        words.codePoints().forEach(point -> {
            switch (point) {
                case '&' -> safe.append("&amp;");
                case '<' -> safe.append("&lt;");
                case '>' -> safe.append("&gt;");
                case '"' -> safe.append("&quot;");
                case '\t', '\n', '\r' -> safe.append(' ');
                default -> safe.appendCodePoint(allowed(point) ? point : 0xFFFD);
            }
        });
        return safe.toString();
    }

    private static boolean allowed(int point) {
        return point >= 0x20 && point != 0xFFFE && point != 0xFFFF && (point < 0xD800 || point > 0xDFFF);
    }

    @Override
    public String toString() {
        return out.toString();
    }
}
