// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import tariff.meter.Charged;
import tariff.meter.MeteredMonth;
import tariff.meter.Period;
import tariff.meter.Readings;
import tariff.rate.clause.Written;

/** A billing period with its registers by {@link tariff.meter.Register#key()}, its windows and what was charged for it. */
final class MonthJson {
    private MonthJson() {}

    /** Empty if it does not say which days it bills. */
    static Optional<MeteredMonth> read(Written in) {
        if (!in.isObject()) {
            in.wrong("type", "must be a billing period", "an object with \"month\", or with \"from\" and \"to\"");
            return Optional.empty();
        }
        Optional<Period> period = PeriodJson.read(in);
        Readings totals = ReadingsJson.read(in);
        Map<String, Readings> windows = in.named("windows", MonthJson::window);
        Charged charged = in.has("charged") ? charged(in.at("charged")) : Charged.nothingKnown();
        Optional<LocalDate> statementDate = PeriodJson.day(in, "statementDate");
        boolean estimated = in.flag("estimated");
        in.refuseOtherKeys();
        return period.map(
                days -> new MeteredMonth(days, totals, windows, charged, statementDate, estimated, Optional.empty()));
    }

    private static Readings window(Written in) {
        Readings readings = Readings.none();
        if (in.isObject()) {
            readings = ReadingsJson.read(in);
            in.refuseOtherKeys();
        } else {
            in.wrong("type", "must be an object", "an object with the registers of the window");
        }
        return readings;
    }

    private static Charged charged(Written in) {
        if (!in.isObject()) {
            in.wrong("type", "must be an object", "an object with \"total\", \"lines\" or both");
            return Charged.nothingKnown();
        }
        Map<String, BigDecimal> lines = new LinkedHashMap<>(in.named("lines", Written::number));
        Charged charged = new Charged(in.optionalNumber("total"), lines);
        in.refuseOtherKeys();
        return charged;
    }

    static JsonObject write(MeteredMonth month) {
        JsonObject windows = new JsonObject();
        month.windows().forEach((name, readings) -> windows.with(name, ReadingsJson.write(new JsonObject(), readings)));
        JsonObject lines = new JsonObject();
        month.charged().lines().forEach(lines::with);
        JsonObject charged =
                new JsonObject().withIf("total", month.charged().total()).withUnlessEmpty("lines", lines);
        JsonObject json = ReadingsJson.write(PeriodJson.write(new JsonObject(), month.period()), month.totals())
                .withUnlessEmpty("windows", windows)
                .withIf("statementDate", month.statementDate())
                .withUnlessEmpty("charged", charged);
        return month.estimated() ? json.with("estimated", true) : json;
    }
}
