// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** The frame of the report: head, skip link, contents, sections. */
final class Page {
    private static final String NOTHING_FROM_OUTSIDE =
            "default-src 'none'; style-src 'unsafe-inline'; base-uri 'none'; form-action 'none'";

    private Page() {}

    static String of(Report report) {
        String title = "Power factor and bill: " + report.site();
        Html page = new Html();
        page.open("html", "lang", "en").open("head");
        page.single("meta", "charset", "utf-8");
        page.single("meta", "http-equiv", "Content-Security-Policy", "content", NOTHING_FROM_OUTSIDE);
        page.single("meta", "name", "viewport", "content", "width=device-width, initial-scale=1");
        page.text("title", title);
        page.open("style").markup(style()).close().close().open("body");
        page.text("a", "Skip to the short answer", "class", "skip", "href", "#main");
        page.open("header").text("h1", title);
        page.text("p", under(report), "class", "under").close();
        page.open("main", "id", "main", "tabindex", "-1");
        List<Section> sections = Section.all();
        write(page, sections.get(0), report);
        contents(page, sections);
        sections.stream().skip(1).forEach(section -> write(page, section, report));
        return page.close().close().close().toString();
    }

    private static String under(Report report) {
        return report.assessment().billing().rate().name() + ", bills of " + report.span() + ", amounts in "
                + report.currency()
                + report.dated().map(day -> ", dated " + day).orElse("") + ".";
    }

    private static void contents(Html page, List<Section> sections) {
        page.open("nav", "aria-label", "Contents").open("ul");
        for (Section section : sections.subList(1, sections.size())) {
            page.open("li")
                    .text("a", section.title(), "href", "#" + section.id())
                    .close();
        }
        page.close().close();
    }

    private static void write(Html page, Section section, Report report) {
        page.open("section", "id", section.id(), "aria-labelledby", section.id() + "-title");
        page.text("h2", section.title(), "id", section.id() + "-title");
        section.write(page, report);
        page.close();
    }

    private static String style() {
        try (InputStream in = Page.class.getResourceAsStream("report.css")) {
            if (in == null) {
                throw new IllegalStateException("the library comes without report.css");
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
