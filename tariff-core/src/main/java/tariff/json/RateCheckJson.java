// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import tariff.rate.Rate;
import tariff.rate.RateWords;

/** What a check of a rate found, the first hundred of it, and the rate in words if it can be used. */
public final class RateCheckJson {
    private static final int MOST_FINDINGS = 100;

    private RateCheckJson() {}

    public static JsonObject write(Rate.Checked checked) {
        JsonObject json = new JsonObject()
                .with("usable", checked.rate().isPresent())
                .withAll(
                        "findings",
                        checked.findings().stream().limit(MOST_FINDINGS).toList(),
                        NoticeJson::write);
        checked.rate().ifPresent(rate -> json.with("words", words(rate.words())));
        return json;
    }

    private static JsonObject words(RateWords words) {
        return new JsonObject()
                .with("heading", words.heading())
                .withTexts("definitions", words.definitions())
                .withTexts("lines", words.lines())
                .with("closing", words.closing());
    }
}
