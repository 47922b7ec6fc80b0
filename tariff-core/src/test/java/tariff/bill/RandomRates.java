// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;

/** Rates that compile and months that they can bill, of every kind that monthly figures can feed. */
final class RandomRates {
    private static final List<String> MODES = List.of("halfUp", "halfDown", "halfEven", "up", "down");

    private final Random random;
    private final List<String> lines = new ArrayList<>();

    RandomRates(long seed) {
        this.random = new Random(seed);
    }

    String rate() {
        lines.clear();
        StringBuilder out = new StringBuilder("{ 'name': 'Random', 'currency': 'EUR', ");
        if (chance(3)) {
            out.append("'roundLines': ").append(chance(2) ? "'not', " : rounding(List.of("0.01", "1", "0.05")) + ", ");
        }
        out.append("'powerFactors': { 'a': ")
                .append(powerFactor())
                .append(", 'b': ")
                .append(powerFactor())
                .append(" }, ");
        out.append("'windows': { 'day': { 'from': '07:00', 'to': '21:00' } }, ");
        out.append(
                "'seasons': { 'summer': { 'from': '05-11', 'to': '09-20' }, 'winter': { 'from': '09-21', 'to': '05-10' } }, ");
        out.append("'quantities': { 'billed': ")
                .append(demand(2))
                .append(", 'counted': ")
                .append(energy(2))
                .append(" }, 'lines': [ ");
        int count = 2 + random.nextInt(5);
        List<String> written = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            String line = "{ 'name': 'Line " + i + "', " + (chance(6) ? "'shownOnly': true, " : "")
                    + (chance(5) ? "'when': " + condition() + ", " : "")
                    + (chance(6) ? "'round': " + rounding(List.of("0.01", "0.1", "1")) + ", " : "") + line() + " }";
            written.add(line);
            lines.add("Line " + i);
        }
        return out.append(String.join(", ", written)).append(" ] }").toString().replace('\'', '"');
    }

    private String line() {
        int kind = lines.isEmpty() ? 0 : random.nextInt(8);
        if (kind == 5) {
            return "'percentOf': " + base() + ", "
                    + (chance(2) ? "'percent': " + number(-5, 25) : "'schedule': " + schedule(true));
        } else if (kind == 6) {
            return "'" + (chance(2) ? "atLeast" : "atMost") + "': " + money() + ", 'of': " + base();
        }
        boolean energy = chance(2);
        String quantity = random.nextInt(5) == 0 ? "{ 'days': 'period' }" : energy ? energy(3) : demand(3);
        boolean days = quantity.contains("'days'");
        return "'quantity': " + quantity + ", " + (chance(3) && energy && !days ? blocks(true) : "'price': " + price());
    }

    private String base() {
        return "['" + lines.get(random.nextInt(lines.size())) + "']";
    }

    private String money() {
        return switch (random.nextInt(4)) {
            case 0 -> "{ 'constant': " + number(100, 5000) + ", 'unit': 'money' }";
            case 1 -> "{ 'priced': " + demand(1) + ", 'at': " + price() + " }";
            case 2 -> "{ 'share': 0." + (1 + random.nextInt(9)) + ", 'of': { 'amount': " + base() + " } }";
            default ->
                "{ 'share': 0.7, 'of': { 'earlier': '" + pick("highest", "mean", "sum", "lowest")
                        + "', 'of': { 'amount': " + base() + " }, 'months': 3 } }";
        };
    }

    private String condition() {
        return switch (random.nextInt(4)) {
            case 0 -> "{ 'season': '" + pick("summer", "winter") + "' }";
            case 1 -> "{ 'not': { 'option': 'primary metered' } }";
            case 2 -> "{ 'quantity': " + energy(1) + ", 'exceeds': { 'share': 0.5, 'of': { 'energy': 'kWh' } } }";
            default ->
                "{ 'quantity': { 'peak': 'kW' }, 'reaches': { 'constant': " + (100 * random.nextInt(10))
                        + ", 'unit': 'kW' } }";
        };
    }

    private String price() {
        return switch (random.nextInt(7)) {
            case 0 -> "{ 'bySeason': { 'summer': " + number(0, 9) + ", 'winter': " + number(-2, 5) + " } }";
            case 1 ->
                "{ 'byDate': [ { 'from': '2020-01-01', 'price': " + number(0, 9) + " }, { 'from': '2026-0"
                        + (1 + random.nextInt(6)) + "-13', 'price': " + number(0, 9) + " } ] }";
            case 2 -> "{ 'bySchedule': " + schedule(false) + " }";
            case 3 -> "{ " + blocks(false) + " }";
            default -> number(0, 9);
        };
    }

    private String blocks(boolean energy) {
        List<String> blocks = new ArrayList<>();
        int count = 1 + random.nextInt(3);
        for (int i = 1; i < count + 1; i++) {
            String edge = !energy || chance(2)
                    ? String.valueOf(i * (50 + random.nextInt(400)) * (energy ? 100 : 1) + i * 100_000)
                    : chance(2)
                            ? "{ 'share': " + number(0, 1) + ", 'of': { 'energy': 'kWh' } }"
                            : "{ 'hours': " + (100 * i) + ", 'of': 'billed' }";
            blocks.add("{ 'upTo': " + edge + ", 'price': " + (chance(3) ? "0" : number(0, 1)) + " }");
        }
        blocks.add("{ 'price': " + number(0, 1) + " }");
        if (!energy) {
            blocks.set(0, "{ 'upTo': " + number(10, 300) + ", 'price': " + number(0, 9) + " }");
        }
        return "'blocks': [ " + String.join(", ", blocks) + " ]";
    }

    private String schedule(boolean percent) {
        String s = "{ 'powerFactor': '" + pick("a", "b") + "', ";
        String target = pick("0.80", "0.85", "0.9", "0.93", "0.95", "1");
        s += switch (random.nextInt(4)) {
            case 0 ->
                "'slopes': [ { 'below': " + target + ", 'perPoint': " + number(0, 3)
                        + " }, { 'below': 0.7, 'perPoint': "
                        + number(0, 5) + " }"
                        + (target.equals("1") ? "" : ", { 'above': " + target + ", 'perPoint': " + number(-1, 0) + " }")
                        + " ], 'points': '" + pick("exact", "started", "completed", "majorFraction") + "'";
            case 1 ->
                "'bands': [ { '" + pick("below", "upTo") + "': 0.7, 'value': " + number(5, 30) + " }, { '"
                        + pick("below", "upTo") + "': 0.8, 'value': " + number(0, 9) + " }, { 'value': " + number(-2, 0)
                        + " } ]";
            case 2 -> "'ratioTo': " + target + ", 'below': " + number(10, 120) + ", 'above': " + number(0, 40);
            default -> "'ratioTo': " + target + (chance(2) ? ", 'onlyBelow': " + pick("0.8", "0.9", "0.96") : "");
        };
        s += chance(3) ? ", 'atMost': " + number(3, 40) : "";
        s += chance(3) ? ", 'atLeast': " + number(-3, 1) : "";
        s += chance(3)
                ? ", 'round': " + rounding(percent ? List.of("0.1", "0.01", "1") : List.of("0.0001", "0.01"))
                : "";
        return s + " }";
    }

    private String powerFactor() {
        String round = chance(2) ? ", 'round': " + rounding(List.of("0.01", "0.001", "0.0001")) : "";
        return switch (random.nextInt(6)) {
            case 0 -> "{ 'from': 'printed'" + round + " }";
            case 1 -> "{ 'from': 'kVAh'" + round + " }";
            case 2 -> "{ 'from': 'peak'" + round + " }";
            case 3 -> "{ 'from': 'energies', 'in': 'day'" + round + " }";
            default ->
                "{ 'from': 'energies', 'leading': '" + pick("ignored", "added", "netted", "larger") + "'" + round
                        + " }";
        };
    }

    private String demand(int depth) {
        if (depth == 0) {
            return pick(
                    "{ 'peak': 'kW' }",
                    "{ 'peak': 'kVA' }",
                    "{ 'agreed': 'kW' }",
                    "{ 'peak': 'kW', 'in': 'day' }",
                    "{ 'peak': 'lagging kvar' }");
        }
        return combined(demand0(depth - 1), demand0(depth - 1), depth, "kW");
    }

    private String demand0(int depth) {
        return demand(random.nextInt(depth + 1));
    }

    private String energy(int depth) {
        if (depth == 0) {
            return pick(
                    "{ 'energy': 'kWh' }",
                    "{ 'energy': 'lagging kvarh' }",
                    "{ 'energy': 'leading kvarh' }",
                    "{ 'energy': 'kVAh' }",
                    "{ 'energy': 'exported kWh' }",
                    "{ 'energy': 'lagging kvarh', 'in': 'day' }");
        }
        if (chance(6)) {
            return "{ 'hours': " + number(50, 400) + ", 'of': " + demand(depth - 1) + " }";
        }
        return combined(energy(random.nextInt(depth)), energy(random.nextInt(depth)), depth, "kWh");
    }

    private String combined(String first, String second, int depth, String unit) {
        return switch (random.nextInt(11)) {
            case 0 -> "{ 'share': " + number(0, 2) + ", 'of': " + first + " }";
            case 1 -> "{ 'sum': [ " + first + ", { 'share': " + number(-1, 1) + ", 'of': " + first + " } ] }";
            case 2 ->
                "{ 'largest': [ " + first + ", " + second + ", { 'constant': " + number(50, 500) + ", 'unit': '" + unit
                        + "' } ] }";
            case 3 -> "{ 'smallest': [ " + first + ", " + second + " ] }";
            case 4 -> "{ 'excess': " + first + ", 'over': { 'share': " + number(0, 1) + ", 'of': " + second + " } }";
            case 5 -> "{ 'all': " + first + ", 'onceAbove': { 'share': " + number(0, 1) + ", 'of': " + second + " } }";
            case 6 ->
                "{ 'rounded': " + first + ", "
                        + rounding(List.of("1", "0.1", "5")).substring(2);
            case 7 -> "{ 'raised': " + first + ", 'by': " + schedule(true) + " }";
            case 8 ->
                first.contains("'earlier'")
                        ? first
                        : "{ 'earlier': '" + pick("highest", "lowest", "sum", "mean") + "', 'of': " + first + ", "
                                + (chance(3)
                                        ? "'since': " + (1 + random.nextInt(12))
                                        : "'months': " + (1 + random.nextInt(4)))
                                + (chance(3) ? ", 'onlyIn': [1, 2, 3, 5, 6]" : "") + " }";
            case 9 ->
                "{ 'prorated': " + first + ", 'perDays': " + pick("1", "30", "31")
                        + (chance(2) ? ", 'unlessDays': [28, 30]" : "") + " }";
            default -> first;
        };
    }

    private String rounding(List<String> steps) {
        return "{ 'to': " + steps.get(random.nextInt(steps.size()))
                + (chance(2) ? "" : ", 'mode': '" + MODES.get(random.nextInt(5)) + "'") + " }";
    }

    /** Five months in a row, calendar months or from the 11th to the 10th. */
    List<NaiveBill.Month> months() {
        LocalDate start = LocalDate.of(2026, 1, chance(2) ? 1 : 11).plusMonths(random.nextInt(12));
        List<NaiveBill.Month> months = new ArrayList<>();
        for (int i = 0; i < 5; i++) {
            Map<String, BigDecimal> figures = new HashMap<>();
            figures("", figures);
            figures("day/", figures);
            months.add(new NaiveBill.Month(
                    start.plusMonths(i), start.plusMonths(i + 1).minusDays(1), figures));
        }
        return months;
    }

    private void figures(String window, Map<String, BigDecimal> figures) {
        boolean idle = chance(20);
        boolean round = chance(2);
        figures.put(window + "energyKwh", idle ? BigDecimal.ZERO : round ? figure(4, 160_000) : figure(200_000));
        figures.put(window + "laggingKvarh", round ? figure(3, 160_000) : figure(150_000));
        figures.put(window + "leadingKvarh", chance(2) ? BigDecimal.ZERO : figure(40_000));
        figures.put(window + "exportedKwh", chance(2) ? BigDecimal.ZERO : figure(40_000));
        figures.put(window + "apparentKvah", figures.get(window + "energyKwh").add(figure(40_000)));
        figures.put(window + "peakKw", round ? figure(4, 400) : figure(900));
        figures.put(window + "peakKva", figures.get(window + "peakKw").add(figure(200)));
        figures.put(window + "peakLaggingKvar", figure(500));
        figures.put(window + "peakLeadingKvar", figure(100));
        if (!idle) {
            figures.put(
                    window + "powerFactor",
                    chance(3)
                            ? new BigDecimal(pick("0.7", "0.8", "0.85", "0.9", "0.95", "1"))
                            : new BigDecimal("0." + (5000 + random.nextInt(5000))));
        }
    }

    /** Multiples that make right triangles of 3, 4 and 5, so that power factors fall on edges. */
    private static BigDecimal figure(int side, int scale) {
        return new BigDecimal(side * (scale / 4));
    }

    private BigDecimal figure(int below) {
        return BigDecimal.valueOf(random.nextInt(below * 10) + 1L, 1);
    }

    private String number(int least, int most) {
        int decimals = random.nextInt(5);
        long span = (long) (most - least) * (long) Math.pow(10, decimals);
        return BigDecimal.valueOf((long) (random.nextDouble() * (span + 1)), decimals)
                .add(BigDecimal.valueOf(least))
                .toPlainString();
    }

    private String pick(String... words) {
        return words[random.nextInt(words.length)];
    }

    private boolean chance(int oneIn) {
        return random.nextInt(oneIn) == 0;
    }
}
