// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import java.math.BigDecimal;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import tariff.meter.Site;
import tariff.meter.Unit;
import tariff.rate.clause.Written;

/** A site: {@code { "name": "…", "agreed": { "kW": 450 }, "options": ["primary metered"] }}, every key optional. */
final class SiteJson {
    private static final List<Unit> UNITS = List.of(Unit.KW, Unit.KVA, Unit.KVAR, Unit.KWH);

    private SiteJson() {}

    static Site read(Written in) {
        if (!in.isObject()) {
            in.wrong("type", "must be an object", "an object with any of: name, agreed, options");
            return Site.unnamed();
        }
        Map<Unit, BigDecimal> agreed = new EnumMap<>(Unit.class);
        if (in.has("agreed")) {
            Written figures = in.at("agreed");
            if (!figures.isObject()) {
                figures.wrong("type", "must be an object", "an object with any of: kW, kVA, kvar, kWh");
            }
            UNITS.forEach(unit -> figures.optionalNumber(unit.symbol())
                    .ifPresent(number -> agreed.put(unit, notNegative(figures.at(unit.symbol()), number))));
            figures.refuseOtherKeys();
        }
        Set<String> options = new TreeSet<>();
        if (in.has("options")) {
            in.at("options").entries().forEach(option -> options.add(option.text()));
        }
        Site site = new Site(in.optionalText("name").orElse(""), agreed, options);
        in.refuseOtherKeys();
        return site;
    }

    static BigDecimal notNegative(Written in, BigDecimal number) {
        if (number.signum() < 0) {
            in.wrong("number", "is below zero", "0 or more");
        }
        return number;
    }

    static JsonObject write(Site site) {
        JsonObject agreed = new JsonObject();
        site.agreed().forEach((unit, figure) -> agreed.with(unit.symbol(), figure));
        JsonObject json = new JsonObject();
        if (!site.name().isEmpty()) {
            json.with("name", site.name());
        }
        json.withUnlessEmpty("agreed", agreed);
        return site.options().isEmpty() ? json : json.withTexts("options", site.options());
    }
}
