// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

/** Words as markup may hold them. */
public final class Markup {
    private Markup() {}

    /** What XML and HTML read as markup becomes an entity, what they forbid in a text a replacement character. */
    public static String escaped(String words) {
        StringBuilder safe = new StringBuilder();
        words.codePoints().forEach(point -> {
            switch (point) {
                case '&' -> safe.append("&amp;");
                case '<' -> safe.append("&lt;");
                case '>' -> safe.append("&gt;");
                case '"' -> safe.append("&quot;");
                case '\'' -> safe.append("&#39;");
                case '\t', '\n', '\r' -> safe.append(' ');
                default -> safe.appendCodePoint(allowed(point) ? point : 0xFFFD);
            }
        });
        return safe.toString();
    }

    /** Neither a control character, nor half of a pair, nor one that turns the direction of what follows. */
    private static boolean allowed(int point) {
        boolean control = Character.isISOControl(point) || Character.getType(point) == Character.SURROGATE;
        boolean turning = (point >= 0x202A && point <= 0x202E) || (point >= 0x2066 && point <= 0x2069);
        return !control && !turning && (point & 0xFFFE) != 0xFFFE;
    }
}
