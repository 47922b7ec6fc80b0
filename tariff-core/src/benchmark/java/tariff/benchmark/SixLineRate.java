// SPDX-License-Identifier: Apache-2.0
package tariff.benchmark;

import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.LAGGING_KVARH;
import static tariff.meter.Register.LEADING_KVARH;
import static tariff.meter.Register.PEAK_KVA;
import static tariff.meter.Register.PEAK_KW;
import static tariff.meter.Register.PEAK_LAGGING_KVAR;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import tariff.meter.MeteredMonth;
import tariff.meter.Site;
import tariff.meter.Unit;

/** The rate, the site and the year that both sides of the benchmark work on. */
final class SixLineRate {
    static final String JSON = """
            { "name": "Six lines", "currency": "EUR",
              "powerFactors": { "billing": { "from": "energies", "round": { "to": 0.001, "mode": "halfUp" } } },
              "quantities": { "billed demand": { "rounded": { "largest": [
                  { "raised": { "peak": "kW" }, "by": { "powerFactor": "billing", "ratioTo": 0.95 } },
                  { "share": 0.6, "of": { "agreed": "kW" } } ] }, "to": 1, "mode": "halfUp" } },
              "lines": [
                { "name": "Standing charge", "quantity": { "days": "period" }, "price": 2.35 },
                { "name": "Energy", "quantity": { "energy": "kWh" }, "blocks": [
                    { "upTo": { "hours": 200, "of": "billed demand" }, "price": 0.1125 }, { "price": 0.0890 } ] },
                { "name": "Demand", "quantity": "billed demand", "price": 12.40 },
                { "name": "Reactive energy", "quantity": { "energy": "lagging kvarh" }, "blocks": [
                    { "upTo": { "share": 0.33, "of": { "energy": "kWh" } }, "price": 0 },
                    { "upTo": { "share": 0.75, "of": { "energy": "kWh" } }, "price": 0.0420 }, { "price": 0.0610 } ] },
                { "name": "Surcharge", "percentOf": [ "Energy", "Demand" ], "schedule": { "powerFactor": "billing",
                    "slopes": [ { "below": 0.90, "perPoint": 1.0 } ], "points": "started", "atMost": 25 } },
                { "name": "Tax", "percentOf": "all above", "percent": 6 } ] }""";

    static final BigDecimal BANK_KVAR = new BigDecimal("150");

    private SixLineRate() {}

    static Site site() {
        return new Site("bench", Map.of(Unit.KW, new BigDecimal("450")), Set.of());
    }

    static List<MeteredMonth> year() {
        List<MeteredMonth> months = new ArrayList<>();
        for (int month = 1; month <= 12; month++) {
            months.add(MeteredMonth.of(String.format("2025-%02d", month))
                    .with(ENERGY_KWH, 150_000 + 3_137 * month)
                    .with(LAGGING_KVARH, 120_000 + 1_931 * (month % 5))
                    .with(LEADING_KVARH, 0)
                    .with(PEAK_KW, 400 + 7 * (month % 4))
                    .with(PEAK_KVA, 507 + 9 * (month % 4))
                    .with(PEAK_LAGGING_KVAR, 320));
        }
        return months;
    }
}
