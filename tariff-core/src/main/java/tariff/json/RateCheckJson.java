// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import tariff.rate.Rate;
import tariff.rate.RateWords;

/** What a check of a rate found, and the rate in words if it can be used. */
public final class RateCheckJson {
    private RateCheckJson() {}

    public static JsonObject write(Rate.Checked checked) {
        JsonObject json = new JsonObject()
                .with("usable", checked.rate().isPresent())
                .withAll("findings", checked.findings(), NoticeJson::write);
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
