// SPDX-License-Identifier: Apache-2.0
package tariff.report;

/** A chart with a caption; on a narrow screen it scrolls by itself rather than shrink beyond reading. */
final class Drawing {
    private Drawing() {}

    static void write(Html page, String id, String caption, String svg) {
        page.open("figure", "id", id);
        page.open("div", "class", "wide", "role", "region", "tabindex", "0", "aria-labelledby", id + "-caption");
        page.markup(svg).close();
        page.text("figcaption", caption, "id", id + "-caption");
        page.close();
    }
}
