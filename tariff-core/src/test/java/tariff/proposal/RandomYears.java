// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.LAGGING_KVARH;
import static tariff.meter.Register.LEADING_KVARH;
import static tariff.meter.Register.PEAK_KVA;
import static tariff.meter.Register.PEAK_KW;
import static tariff.meter.Register.PEAK_LAGGING_KVAR;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import tariff.bill.Bills;
import tariff.correction.CapacitorBank;
import tariff.correction.Controller;
import tariff.meter.MeteredMonth;
import tariff.meter.Window;
import tariff.payback.Outlook;

/** Invented rates, years and prices from a seed. */
final class RandomYears {
    private static final String ENERGY = "{ 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'price': 0.1 }";

    private static final String[] LEADING = {"ignored", "added", "netted", "larger"};

    private RandomYears() {}

    static String rate(Random random) {
        String from = random.nextBoolean() ? "peak'" : "energies', 'leading': '" + LEADING[random.nextInt(4)] + "'";
        String powerFactor =
                "'billing': { 'from': '" + from + (random.nextBoolean() ? ", 'round': { 'to': 0.01 }" : "") + " }";
        int kind = random.nextInt(7);
        double price = 0.01 + random.nextInt(60) / 1000.0;
        String lines = switch (kind) {
            case 0 -> "{ 'name': 'Demand', 'quantity': { 'peak': 'kVA' }, 'price': " + (2 + random.nextInt(15)) + " }";
            case 1 ->
                "{ 'name': 'Reactive', 'quantity': { 'energy': 'lagging kvarh' }, 'blocks': [ { 'upTo': { 'share': 0."
                        + (25 + random.nextInt(30)) + ", 'of': { 'energy': 'kWh' } }, 'price': 0 }, { 'price': " + price
                        + " } ] }";
            case 2 ->
                "{ 'name': 'Surcharge', 'percentOf': [ 'Energy' ], 'schedule': { 'powerFactor': 'billing', 'slopes': [ {"
                        + " 'below': 0.9, 'perPoint': 1 }, { 'below': 0.8, 'perPoint': 2 }, { 'above': 0.95, 'perPoint': -0.5 } ],"
                        + " 'points': '" + (random.nextBoolean() ? "started" : "exact") + "' } }";
            case 3 ->
                "{ 'name': 'Surcharge', 'percentOf': [ 'Energy' ], 'schedule': { 'powerFactor': 'billing', 'bands': [ {"
                        + " 'below': 0.75, 'value': 12 }, { 'below': 0.85, 'value': 6 }, { 'below': 0.93, 'value': 2 }, { 'value': 0 }"
                        + " ] } }";
            case 4 ->
                "{ 'name': 'Demand', 'quantity': { 'rounded': { 'raised': { 'peak': 'kW' }, 'by': { 'powerFactor': 'billing',"
                        + " 'ratioTo': 0.95, 'atLeast': 0 } }, 'to': 1 }, 'price': " + (3 + random.nextInt(12)) + " }";
            case 5 ->
                "{ 'name': 'Demand', 'quantity': { 'largest': [ { 'peak': 'kVA' }, { 'share': 0.8, 'of': { 'earlier': 'highest',"
                        + " 'of': { 'peak': 'kVA' }, 'months': 11 } } ] }, 'price': " + (2 + random.nextInt(15)) + " }";
            default ->
                "{ 'name': 'Cliff', 'quantity': { 'all': { 'energy': 'lagging kvarh' }, 'onceAbove': { 'share': 0.5, 'of': {"
                        + " 'energy': 'kWh' } } }, 'price': " + price + " }";
        };
        String leading = random.nextBoolean()
                ? ", { 'name': 'Leading', 'quantity': { 'energy': 'leading kvarh' }, 'price': " + price + " }"
                : "";
        return Bills.rate(powerFactor, "", ENERGY + ", " + lines + leading);
    }

    static List<MeteredMonth> year(Random random) {
        List<MeteredMonth> months = new ArrayList<>();
        int kw = 60 + random.nextInt(240);
        double tangent = 0.3 + random.nextDouble();
        for (int number = 1; number <= 12; number++) {
            double season = 0.7 + 0.3 * random.nextDouble();
            double peak = kw * season;
            double kvar = peak * tangent * (0.8 + 0.3 * random.nextDouble());
            double hours = 250 + random.nextInt(250);
            MeteredMonth month = MeteredMonth.of(String.format("2025-%02d", number))
                    .with(ENERGY_KWH, Math.round(peak * hours))
                    .with(LAGGING_KVARH, Math.round(kvar * hours * (0.8 + 0.4 * random.nextDouble())))
                    .with(LEADING_KVARH, random.nextInt(3) * 100L)
                    .with(PEAK_KW, tenth(peak))
                    .with(PEAK_KVA, tenth(Math.hypot(peak, kvar)));
            months.add(random.nextInt(4) == 0 ? month : month.with(PEAK_LAGGING_KVAR, tenth(kvar * 1.1)));
        }
        return months;
    }

    static PriceList prices(Random random) {
        return new PriceList(
                BigDecimal.valueOf(random.nextInt(3) * 500L),
                BigDecimal.valueOf(8 + random.nextInt(60)),
                BigDecimal.valueOf(15 + random.nextInt(90)),
                BigDecimal.valueOf(random.nextInt(200)),
                new BigDecimal("0.02"),
                10);
    }

    static BankShape shape(Random random) {
        CapacitorBank like = like(random);
        return switch (random.nextInt(3)) {
            case 0 -> new BankShape(BigDecimal.ONE, 0, like);
            case 1 -> new BankShape(BigDecimal.ZERO, 1 + random.nextInt(8), like);
            default -> new BankShape(new BigDecimal("0.3"), 1 + random.nextInt(6), like);
        };
    }

    /** With a time switch or without, with losses or without, aiming at unity or below. */
    private static CapacitorBank like(Random random) {
        CapacitorBank bank = CapacitorBank.fixed("0");
        bank = random.nextBoolean()
                ? bank.offIn(Window.daily(random.nextBoolean() ? "22:00" : "13:00", "06:00"))
                : bank;
        bank = random.nextBoolean() ? bank.withLosses(BigDecimal.valueOf(random.nextInt(10))) : bank;
        return random.nextInt(3) == 0 ? bank.withController(Controller.aimingAt(new BigDecimal("0.96"))) : bank;
    }

    static Outlook outlook() {
        return Outlook.level(new BigDecimal("0.08"));
    }

    private static String tenth(double value) {
        return new BigDecimal(value).setScale(1, RoundingMode.UP).toPlainString();
    }
}
