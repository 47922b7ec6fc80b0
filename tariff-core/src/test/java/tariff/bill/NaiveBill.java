// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static tariff.bill.NaiveSchedule.DIGITS;
import static tariff.bill.NaiveSchedule.map;
import static tariff.bill.NaiveSchedule.number;
import static tariff.bill.NaiveSchedule.round;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/**
 * Bills once more, from the formulas as rate sheets state them and the rate file as plain maps, with nothing of the engine: slow, without
 * explanation, and short enough to be believed.
 */
@SuppressWarnings("unchecked")
final class NaiveBill {
    private static final BigDecimal HUNDRED = new BigDecimal(100);

    /** A month as a table of figures: {@code energyKwh}, or {@code day/energyKwh} in a window. */
    record Month(LocalDate first, LocalDate last, Map<String, BigDecimal> figures) {
        int days() {
            return (int) (last.toEpochDay() - first.toEpochDay()) + 1;
        }
    }

    private final Map<String, Object> rate;
    private final Map<String, BigDecimal> agreed;
    private final List<Month> months;
    private final int now;

    NaiveBill(Map<String, Object> rate, Map<String, BigDecimal> agreed, List<Month> months, int now) {
        this.rate = rate;
        this.agreed = agreed;
        this.months = months;
        this.now = now;
    }

    private Month month() {
        return months.get(now);
    }

    /** Amounts of all lines by name, and the total under "". */
    Map<String, BigDecimal> bill() {
        Map<String, BigDecimal> amounts = new LinkedHashMap<>();
        List<String> above = new ArrayList<>();
        BigDecimal total = BigDecimal.ZERO;
        for (Map<String, Object> line : (List<Map<String, Object>>) rate.get("lines")) {
            BigDecimal money = BigDecimal.ZERO;
            if (!line.containsKey("when") || holds(map(line.get("when")), amounts)) {
                money = round(
                        line(line, amounts, above),
                        line.containsKey("round") ? line.get("round") : rate.get("roundLines"));
            }
            amounts.put((String) line.get("name"), money);
            if (!Boolean.TRUE.equals(line.get("shownOnly"))) {
                above.add((String) line.get("name"));
                total = total.add(money);
            }
        }
        amounts.put("", round(total, rate.get("roundTotal")));
        return amounts;
    }

    private BigDecimal line(Map<String, Object> line, Map<String, BigDecimal> amounts, List<String> above) {
        if (line.containsKey("percentOf")) {
            BigDecimal base = sum(line.get("percentOf"), amounts, above);
            BigDecimal percent =
                    line.containsKey("schedule") ? schedule(map(line.get("schedule"))) : number(line.get("percent"));
            return percent == null ? BigDecimal.ZERO : base.multiply(percent).divide(HUNDRED);
        }
        if (line.containsKey("atLeast")) {
            BigDecimal gap = quantity(line.get("atLeast"), amounts).subtract(sum(line.get("of"), amounts, above));
            return gap.signum() > 0 ? gap : BigDecimal.ZERO;
        }
        if (line.containsKey("atMost")) {
            BigDecimal gap = quantity(line.get("atMost"), amounts).subtract(sum(line.get("of"), amounts, above));
            return gap.signum() < 0 ? gap : BigDecimal.ZERO;
        }
        BigDecimal quantity = quantity(line.get("quantity"), amounts);
        return line.containsKey("blocks")
                ? blocks(line, quantity, amounts)
                : price(line.get("price"), quantity, amounts);
    }

    private static BigDecimal sum(Object lines, Map<String, BigDecimal> amounts, List<String> above) {
        BigDecimal total = BigDecimal.ZERO;
        for (String name : lines instanceof String ? above : (List<String>) lines) {
            total = total.add(amounts.get(name));
        }
        return total;
    }

    private boolean holds(Map<String, Object> when, Map<String, BigDecimal> amounts) {
        if (when.containsKey("not")) {
            return !holds(map(when.get("not")), amounts);
        }
        if (when.containsKey("option")) {
            return false;
        }
        if (when.containsKey("season")) {
            return daysIn((String) when.get("season")) * 2 > month().days();
        }
        BigDecimal quantity = quantity(when.get("quantity"), amounts);
        return when.containsKey("reaches")
                ? quantity.compareTo(quantity(when.get("reaches"), amounts)) >= 0
                : quantity.compareTo(quantity(when.get("exceeds"), amounts)) > 0;
    }

    private int daysIn(String season) {
        Map<String, Object> dates = map(map(rate.get("seasons")).get(season));
        String from = (String) dates.get("from");
        String to = (String) dates.get("to");
        int days = 0;
        for (LocalDate day = month().first(); !day.isAfter(month().last()); day = day.plusDays(1)) {
            String date = day.toString().substring(5);
            boolean inside = from.compareTo(to) <= 0
                    ? date.compareTo(from) >= 0 && date.compareTo(to) <= 0
                    : date.compareTo(from) >= 0 || date.compareTo(to) <= 0;
            days += inside ? 1 : 0;
        }
        return days;
    }

    private BigDecimal quantity(Object written, Map<String, BigDecimal> amounts) {
        if (written instanceof String name) {
            return quantity(map(rate.get("quantities")).get(name), amounts);
        }
        Map<String, Object> q = map(written);
        String window = q.containsKey("in") ? q.get("in") + "/" : "";
        if (q.containsKey("energy")) {
            return month().figures().get(window + REGISTERS.get("energy " + q.get("energy")));
        } else if (q.containsKey("peak")) {
            return month().figures().get(window + REGISTERS.get("peak " + q.get("peak")));
        } else if (q.containsKey("agreed")) {
            return agreed.get((String) q.get("agreed"));
        } else if (q.containsKey("days")) {
            return new BigDecimal(month().days());
        } else if (q.containsKey("constant")) {
            return number(q.get("constant"));
        } else if (q.containsKey("share")) {
            return number(q.get("share")).multiply(quantity(q.get("of"), amounts));
        } else if (q.containsKey("hours")) {
            return number(q.get("hours")).multiply(quantity(q.get("of"), amounts));
        } else if (q.containsKey("sum")) {
            return all(q.get("sum"), amounts).stream().reduce(BigDecimal.ZERO, BigDecimal::add);
        } else if (q.containsKey("largest")) {
            return all(q.get("largest"), amounts).stream()
                    .max(BigDecimal::compareTo)
                    .orElseThrow();
        } else if (q.containsKey("smallest")) {
            return all(q.get("smallest"), amounts).stream()
                    .min(BigDecimal::compareTo)
                    .orElseThrow();
        } else if (q.containsKey("excess")) {
            BigDecimal excess = quantity(q.get("excess"), amounts).subtract(quantity(q.get("over"), amounts));
            return excess.signum() > 0 ? excess : BigDecimal.ZERO;
        } else if (q.containsKey("all")) {
            BigDecimal whole = quantity(q.get("all"), amounts);
            return whole.compareTo(quantity(q.get("onceAbove"), amounts)) > 0 ? whole : BigDecimal.ZERO;
        } else if (q.containsKey("rounded")) {
            return round(quantity(q.get("rounded"), amounts), q);
        } else if (q.containsKey("raised")) {
            BigDecimal percent = schedule(map(q.get("by")));
            BigDecimal plain = quantity(q.get("raised"), amounts);
            return percent == null
                    ? plain
                    : plain.multiply(HUNDRED.add(percent)).divide(HUNDRED);
        } else if (q.containsKey("prorated")) {
            return prorated(q, amounts);
        } else if (q.containsKey("priced")) {
            return price(q.get("at"), quantity(q.get("priced"), amounts), amounts);
        } else if (q.containsKey("amount")) {
            return sum(q.get("amount"), amounts, List.of());
        }
        return earlier(q);
    }

    private @Nullable BigDecimal schedule(Map<String, Object> written) {
        return new NaiveSchedule(rate, month().figures()).value(written);
    }

    private List<BigDecimal> all(Object list, Map<String, BigDecimal> amounts) {
        List<BigDecimal> values = new ArrayList<>();
        ((List<Object>) list).forEach(each -> values.add(quantity(each, amounts)));
        return values;
    }

    private BigDecimal prorated(Map<String, Object> q, Map<String, BigDecimal> amounts) {
        BigDecimal whole = quantity(q.get("prorated"), amounts);
        List<BigDecimal> unless = (List<BigDecimal>) q.get("unlessDays");
        if (unless != null
                && month().days() >= unless.get(0).intValue()
                && month().days() <= unless.get(1).intValue()) {
            return whole;
        }
        return whole.multiply(new BigDecimal(month().days())).divide(number(q.get("perDays")), DIGITS);
    }

    private BigDecimal earlier(Map<String, Object> q) {
        int back = q.containsKey("since")
                ? (month().first().getMonthValue() - number(q.get("since")).intValue() + 12) % 12
                : number(q.get("months")).intValue();
        List<BigDecimal> values = new ArrayList<>();
        for (int i = now - 1; i >= 0 && i >= now - back; i--) {
            int number = months.get(i).first().getMonthValue();
            if (!q.containsKey("onlyIn") || ((List<BigDecimal>) q.get("onlyIn")).contains(new BigDecimal(number))) {
                NaiveBill then = new NaiveBill(rate, agreed, months, i);
                Object of = q.get("of");
                boolean money = of instanceof Map<?, ?> each && each.containsKey("amount");
                values.add(then.quantity(of, money ? then.bill() : Map.of()));
            }
        }
        if (values.isEmpty()) {
            return BigDecimal.ZERO;
        }
        BigDecimal total = values.stream().reduce(BigDecimal.ZERO, BigDecimal::add);
        return switch ((String) q.get("earlier")) {
            case "highest" -> values.stream().max(BigDecimal::compareTo).orElseThrow();
            case "lowest" -> values.stream().min(BigDecimal::compareTo).orElseThrow();
            case "sum" -> total;
            default -> total.divide(new BigDecimal(values.size()), DIGITS);
        };
    }

    private BigDecimal price(Object written, BigDecimal quantity, Map<String, BigDecimal> amounts) {
        if (written instanceof BigDecimal price) {
            return quantity.multiply(price);
        }
        Map<String, Object> price = map(written);
        if (price.containsKey("blocks")) {
            return blocks(price, quantity, amounts);
        }
        if (price.containsKey("bySchedule")) {
            BigDecimal each = schedule(map(price.get("bySchedule")));
            return each == null ? BigDecimal.ZERO : quantity.multiply(each);
        }
        BigDecimal weighed = BigDecimal.ZERO;
        if (price.containsKey("bySeason")) {
            for (Map.Entry<String, Object> each : map(price.get("bySeason")).entrySet()) {
                weighed = weighed.add(number(each.getValue()).multiply(new BigDecimal(daysIn(each.getKey()))));
            }
        } else {
            for (LocalDate day = month().first(); !day.isAfter(month().last()); day = day.plusDays(1)) {
                BigDecimal today = BigDecimal.ZERO;
                for (Map<String, Object> each : (List<Map<String, Object>>) price.get("byDate")) {
                    today = each.get("from").toString().compareTo(day.toString()) <= 0
                            ? number(each.get("price"))
                            : today;
                }
                weighed = weighed.add(today);
            }
        }
        return quantity.multiply(weighed).divide(new BigDecimal(month().days()), DIGITS);
    }

    private BigDecimal blocks(Map<String, Object> written, BigDecimal quantity, Map<String, BigDecimal> amounts) {
        BigDecimal money = BigDecimal.ZERO;
        BigDecimal begin = BigDecimal.ZERO;
        for (Map<String, Object> block : (List<Map<String, Object>>) written.get("blocks")) {
            BigDecimal end = quantity;
            if (block.containsKey("upTo")) {
                Object edge = block.get("upTo");
                end = edge instanceof BigDecimal fixed ? fixed : quantity(edge, amounts);
            }
            BigDecimal part = end.min(quantity).subtract(begin);
            if (part.signum() > 0) {
                money = money.add(price(block.get("price"), part, amounts));
            }
            begin = begin.max(end);
        }
        return money;
    }

    private static final Map<String, String> REGISTERS = Map.of(
            "energy kWh", "energyKwh",
            "energy lagging kvarh", "laggingKvarh",
            "energy leading kvarh", "leadingKvarh",
            "energy kVAh", "apparentKvah",
            "energy exported kWh", "exportedKwh",
            "peak kW", "peakKw",
            "peak kVA", "peakKva",
            "peak lagging kvar", "peakLaggingKvar",
            "peak leading kvar", "peakLeadingKvar");
}
