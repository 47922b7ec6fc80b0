// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.util.List;
import java.util.stream.Collectors;
import tariff.json.JsonObject;
import tariff.json.RateCheckJson;
import tariff.rate.Rate;

/** A checked rate, printed. */
record CheckAnswer(Rate.Checked checked) implements Format.Printable {

    @Override
    public String text() {
        return checked.rate()
                .map(rate -> rate.words().text().lines().map(Wrapped::text).collect(Collectors.joining()))
                .orElse("");
    }

    @Override
    public JsonObject json() {
        return RateCheckJson.write(checked);
    }

    @Override
    public String csv() {
        Csv csv = new Csv(List.of("severity", "code", "where", "message", "found", "allowed"));
        checked.findings()
                .forEach(finding -> csv.row(List.of(
                        finding.severity().name(),
                        finding.code(),
                        finding.where(),
                        finding.message(),
                        finding.found().orElse(""),
                        finding.allowed().orElse(""))));
        return csv.text();
    }
}
