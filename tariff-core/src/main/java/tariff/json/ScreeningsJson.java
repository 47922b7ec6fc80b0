// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import java.util.Locale;
import tariff.electrical.Screening;
import tariff.notice.Caution;

/** The answers of screens. */
public final class ScreeningsJson {
    /** More digits than any of the data of a screen have. */
    private static final MathContext SHOWN = new MathContext(6);

    private ScreeningsJson() {}

    /** The screens with what a person must know before acting. */
    public static JsonObject write(List<Screening> screens, List<Caution> cautions) {
        return new JsonObject()
                .withAll("screens", screens, ScreeningsJson::write)
                .withAll("cautions", cautions, NoticeJson::write);
    }

    static JsonObject write(Screening screen) {
        JsonObject json = new JsonObject()
                .with("name", screen.name())
                .with(
                        "verdict",
                        screen.verdict().name().toLowerCase(Locale.ROOT).replace('_', '-'))
                .with("found", screen.found());
        if (screen.value().isPresent() && Double.isFinite(screen.value().getAsDouble())) {
            json.with("value", shown(screen.value().getAsDouble())).with("unit", screen.unit());
        }
        return json.with("limit", screen.limit())
                .with("source", screen.source())
                .with("settledBy", screen.settledBy());
    }

    private static BigDecimal shown(double value) {
        return new BigDecimal(value).round(SHOWN).stripTrailingZeros();
    }
}
