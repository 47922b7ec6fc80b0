// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import tariff.rate.RateWords;

/** How the rate was understood, in words, to hold beside the printed sheet. */
final class TheRate implements Section {
    @Override
    public String id() {
        return "rate";
    }

    @Override
    public String title() {
        return "How the rate reads";
    }

    @Override
    public void write(Html page, Report report) {
        RateWords words = report.assessment().billing().rate().words();
        page.paragraph("Hold this beside the utility's sheet; where they differ, this report is wrong.");
        page.paragraph(words.heading() + ".");
        page.list("ul", words.definitions());
        page.list("ol", words.lines());
        page.paragraph(words.closing());
    }
}
