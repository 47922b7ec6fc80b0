// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import java.math.BigDecimal;
import java.time.LocalTime;
import java.time.format.TextStyle;
import java.util.Locale;
import java.util.stream.Collectors;
import tariff.meter.Window;
import tariff.rate.WindowClause;

/** A window that knows no holidays, in the words that {@link WindowClause} reads; what does not limit it is left out. */
final class WindowJson {
    private WindowJson() {}

    static JsonObject write(Window window) {
        JsonObject json = new JsonObject();
        if (window.weekdays().size() < 7) {
            json.with(
                    "weekdays",
                    window.weekdays().stream()
                            .sorted()
                            .map(day -> day.getDisplayName(TextStyle.SHORT, Locale.ENGLISH))
                            .collect(Collectors.joining(", ")));
        }
        if (!window.from().equals(window.to())) {
            json.with("from", window.from().toString());
            json.with(
                    "to",
                    window.to().equals(LocalTime.MIDNIGHT)
                            ? "24:00"
                            : window.to().toString());
        }
        return window.months().size() == 12
                ? json
                : json.withNumbers(
                        "months",
                        window.months().stream()
                                .sorted()
                                .map(month -> BigDecimal.valueOf(month.getValue()))
                                .toList());
    }
}
