// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.LAGGING_KVARH;
import static tariff.meter.Register.PEAK_KVA;
import static tariff.meter.Register.PEAK_KW;
import static tariff.meter.Register.PEAK_LAGGING_KVAR;

import java.util.List;
import java.util.Map;
import java.util.Set;
import tariff.json.RateFile;
import tariff.meter.MeteredMonth;
import tariff.meter.Site;
import tariff.meter.Unit;

/** Short ways to write a worked example: a rate from its essential parts, and the base month that examples share. */
public final class Bills {
    private Bills() {}

    /** 160,000 kWh, 120,000 kvarh lagging, 400 kW, 300 kvar, 500 kVA, power factor 0.80, 30 days. */
    public static MeteredMonth baseMonth() {
        return MeteredMonth.of("2026-04")
                .with(ENERGY_KWH, 160_000)
                .with(LAGGING_KVARH, 120_000)
                .with(PEAK_KW, 400)
                .with(PEAK_LAGGING_KVAR, 300)
                .with(PEAK_KVA, 500);
    }

    /** A rate of the given lines; single quotes stand for double ones. */
    public static String rate(String lines) {
        return rate("'billing': { 'from': 'energies' }", "", lines);
    }

    /** A rate with power factors, other definitions (each followed by a comma) and lines. */
    public static String rate(String powerFactors, String definitions, String lines) {
        return ("{ 'name': 'Worked example', 'currency': 'EUR', 'powerFactors': {" + powerFactors + "}, " + definitions
                        + " 'lines': [" + lines + "] }")
                .replace('\'', '"');
    }

    public static Statement bill(String rate, MeteredMonth month) {
        return bill(rate, Site.unnamed(), List.of(month)).get(0);
    }

    public static List<Statement> bill(String rate, Site site, List<MeteredMonth> months) {
        return new Billing(RateFile.parse(rate), site).statements(months);
    }

    /** A month of April 2026 that gives kWh and lagging kvarh alone. */
    public static MeteredMonth energies(String kwh, String laggingKvarh) {
        return MeteredMonth.of("2026-04").with(ENERGY_KWH, kwh).with(LAGGING_KVARH, laggingKvarh);
    }

    public static Site agreed(Unit unit, String value) {
        return new Site("a site", Map.of(unit, new java.math.BigDecimal(value)), Set.of());
    }

    /** The last line's amount, as the bill prints it. */
    public static String last(Statement statement) {
        return statement.lines().get(statement.lines().size() - 1).amount().toPlainString();
    }
}
