// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import java.util.Locale;
import tariff.notice.Assumption;
import tariff.notice.Caution;
import tariff.notice.Finding;

/** What is said beside a figure. */
public final class NoticeJson {
    private NoticeJson() {}

    /** The place is a {@code pointer} into a JSON document, or {@code where} in words. */
    public static JsonObject write(Finding finding) {
        boolean pointer = finding.where().isEmpty() || finding.where().startsWith("/");
        return new JsonObject()
                .with("severity", finding.severity().name().toLowerCase(Locale.ROOT))
                .with("code", finding.code())
                .with(pointer ? "pointer" : "where", finding.where())
                .with("message", finding.message())
                .withIf("found", finding.found())
                .withIf("allowed", finding.allowed());
    }

    public static JsonObject write(Assumption assumption) {
        return new JsonObject()
                .with("code", assumption.code())
                .with("where", assumption.where())
                .with("message", assumption.message())
                .with("remedy", assumption.remedy());
    }

    static JsonObject write(Caution caution) {
        return new JsonObject()
                .with("code", caution.code())
                .with("message", caution.message())
                .with("source", caution.source());
    }
}
