// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import tariff.notice.Caution;

/** Every caution with its source, in a frame of its own; what can kill is never left out. */
final class BeforeAnybodyActs implements Section {
    @Override
    public String id() {
        return "cautions";
    }

    @Override
    public String title() {
        return "Cautions: read before anybody acts on this";
    }

    @Override
    public void write(Html page, Report report) {
        page.open("div", "class", "caution").open("ul");
        for (Caution caution : report.assessment().cautions()) {
            page.open("li").text("strong", caution.message());
            page.text("span", "Source: " + caution.source() + ".", "class", "source")
                    .close();
        }
        page.close().close();
    }
}
