// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import static tariff.meter.Register.APPARENT_KVAH;
import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.LAGGING_KVARH;
import static tariff.meter.Register.LEADING_KVARH;
import static tariff.meter.Register.PEAK_KVA;
import static tariff.meter.Register.PEAK_KW;
import static tariff.meter.Register.PEAK_LAGGING_KVAR;
import static tariff.meter.Register.POWER_FACTOR;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import tariff.bill.Billing;
import tariff.bill.Statement;
import tariff.json.RateFile;
import tariff.meter.Charged;
import tariff.meter.MeteredMonth;
import tariff.meter.Site;

/** Invented rates and years, and bills for them as a utility would have sent them. */
final class PaidBills {
    /** Every kind of clause that a cause may touch. Single quotes stand for double ones. */
    static final String RATE = """
            { 'name': 'Quayside Works', 'currency': 'EUR',
              'powerFactors': { 'billing': { 'from': 'energies', 'leading': 'ignored', 'round': { 'to': 0.01, 'mode': 'halfUp' } } },
              'seasons': { 'summer': { 'from': '04-15', 'to': '10-14' }, 'winter': { 'from': '10-15', 'to': '04-14' } },
              'quantities': { 'billed demand': { 'rounded': { 'raised': { 'peak': 'kW' },
                  'by': { 'powerFactor': 'billing', 'ratioTo': 0.95 } }, 'to': 1, 'mode': 'halfUp' } },
              'lines': [
                { 'name': 'Standing charge', 'quantity': { 'days': 'period' }, 'price': 2.35 },
                { 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'price': 0.1125 },
                { 'name': 'Demand', 'quantity': 'billed demand', 'price': { 'bySeason': { 'summer': 13.10, 'winter': 11.40 } } },
                { 'name': 'Surcharge', 'percentOf': [ 'Energy', 'Demand' ], 'schedule': { 'powerFactor': 'billing',
                    'slopes': [ { 'below': 0.905, 'perPoint': 1.0 } ], 'points': 'started' } },
                { 'name': 'Tax', 'percentOf': 'all above', 'percent': 6 } ] }""";

    static final String RATCHET = """
            { 'name': 'Quayside Ratchet', 'currency': 'EUR', 'lines': [
                { 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'price': 0.1125 },
                { 'name': 'Demand', 'quantity': { 'largest': [ { 'peak': 'kVA' },
                  { 'share': 0.8, 'of': { 'earlier': 'highest', 'of': { 'peak': 'kVA' }, 'months': 11 } } ] }, 'price': 10 } ] }""";

    private PaidBills() {}

    static Billing billing(String rate) {
        return new Billing(RateFile.parse(rate.replace('\'', '"')), Site.unnamed());
    }

    /** Twelve months of a plant at a power factor of 0.72 to 0.88. */
    static List<MeteredMonth> year(long seed) {
        Random random = new Random(seed);
        List<MeteredMonth> months = new ArrayList<>();
        for (int month = 1; month <= 12; month++) {
            long kwh = 140_000 + random.nextInt(40_000);
            long kvarh = (long) (kwh * (0.55 + 0.4 * random.nextDouble()));
            BigDecimal kw = BigDecimal.valueOf(3_800 + random.nextInt(900), 1);
            double kvar = kw.doubleValue() * (0.65 + 0.3 * random.nextDouble());
            months.add(MeteredMonth.of(String.format("2025-%02d", month))
                    .with(ENERGY_KWH, kwh)
                    .with(LAGGING_KVARH, kvarh)
                    .with(LEADING_KVARH, 3_000 + random.nextInt(9_000))
                    .with(APPARENT_KVAH, (long) (Math.hypot(kwh, kvarh) * 1.04))
                    .with(PEAK_KW, kw.toString())
                    .with(PEAK_LAGGING_KVAR, decimals(kvar, 1))
                    .with(PEAK_KVA, decimals(Math.hypot(kw.doubleValue(), kvar), 1))
                    .with(POWER_FACTOR, decimals(kwh / Math.hypot(kwh, kvarh) - 0.02, 3)));
        }
        return months;
    }

    private static String decimals(double value, int decimals) {
        return BigDecimal.valueOf(value)
                .setScale(decimals, RoundingMode.HALF_UP)
                .toPlainString();
    }

    /** The months as they are given, charged what this rate asks for the months as they really were. */
    static List<MeteredMonth> charged(String rate, List<MeteredMonth> given, List<MeteredMonth> real) {
        List<Statement> statements = billing(rate).statements(List.of(), real);
        List<MeteredMonth> charged = new ArrayList<>();
        for (int i = 0; i < given.size(); i++) {
            charged.add(given.get(i)
                    .withCharged(new Charged(Optional.of(statements.get(i).total()), java.util.Map.of())));
        }
        return charged;
    }

    static List<MeteredMonth> charged(String rate, List<MeteredMonth> months) {
        return charged(rate, months, months);
    }

    /** A year with one month read otherwise. */
    static List<MeteredMonth> with(List<MeteredMonth> year, int place, MeteredMonth month) {
        List<MeteredMonth> changed = new ArrayList<>(year);
        changed.set(place, month);
        return changed;
    }
}
