// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** Power factors, schedules and roundings for {@link NaiveBill}, from the rate file as plain maps. */
@SuppressWarnings("unchecked")
final class NaiveSchedule {
    static final MathContext DIGITS = new MathContext(80);
    private static final BigDecimal HUNDRED = new BigDecimal(100);

    private final Map<String, Object> rate;
    private final Map<String, BigDecimal> figures;

    NaiveSchedule(Map<String, Object> rate, Map<String, BigDecimal> figures) {
        this.rate = rate;
        this.figures = figures;
    }

    /** Empty (null) in a month without a power factor. */
    @Nullable
    BigDecimal value(Map<String, Object> s) {
        BigDecimal pf = powerFactor(map(map(rate.get("powerFactors")).get((String) s.get("powerFactor"))));
        if (pf == null) {
            return null;
        }
        BigDecimal value = BigDecimal.ZERO;
        if (s.containsKey("ratioTo")) {
            BigDecimal target = number(s.get("ratioTo"));
            BigDecimal below = s.containsKey("below") ? number(s.get("below")) : HUNDRED;
            BigDecimal above = s.containsKey("above") ? number(s.get("above")) : BigDecimal.ZERO;
            BigDecimal k = pf.compareTo(target) < 0 ? below : above;
            boolean off = s.containsKey("onlyBelow") && pf.compareTo(number(s.get("onlyBelow"))) >= 0;
            value = off
                    ? BigDecimal.ZERO
                    : k.multiply(target).subtract(k.multiply(pf)).divide(pf, DIGITS);
        } else if (s.containsKey("bands")) {
            value = band((List<Map<String, Object>>) s.get("bands"), pf);
        } else {
            value = slopes((List<Map<String, Object>>) s.get("slopes"), pf, (String) s.getOrDefault("points", "exact"));
        }
        value = round(value, s.get("round"), null);
        if (s.containsKey("atLeast") && value.compareTo(number(s.get("atLeast"))) < 0) {
            value = number(s.get("atLeast"));
        }
        if (s.containsKey("atMost") && value.compareTo(number(s.get("atMost"))) > 0) {
            value = number(s.get("atMost"));
        }
        return value;
    }

    private static BigDecimal band(List<Map<String, Object>> bands, BigDecimal pf) {
        for (Map<String, Object> band : bands) {
            boolean inside = band.containsKey("below")
                    ? pf.compareTo(number(band.get("below"))) < 0
                    : !band.containsKey("upTo") || pf.compareTo(number(band.get("upTo"))) <= 0;
            if (inside) {
                return number(band.get("value"));
            }
        }
        throw new IllegalStateException("no band");
    }

    /** Each slope runs from its edge to the nearest edge beyond it on the same side, or to the power factor if that is nearer. */
    private static BigDecimal slopes(List<Map<String, Object>> slopes, BigDecimal pf, String points) {
        BigDecimal value = BigDecimal.ZERO;
        for (Map<String, Object> slope : slopes) {
            String side = slope.containsKey("below") ? "below" : "above";
            BigDecimal sign = new BigDecimal(side.equals("below") ? -1 : 1);
            BigDecimal edge = number(slope.get(side)).multiply(sign);
            BigDecimal end = pf.multiply(sign);
            for (Map<String, Object> other : slopes) {
                if (other.containsKey(side)) {
                    BigDecimal next = number(other.get(side)).multiply(sign);
                    end = next.compareTo(edge) > 0 ? end.min(next) : end;
                }
            }
            BigDecimal distance = end.subtract(edge).multiply(HUNDRED);
            if (distance.signum() > 0) {
                BigDecimal count = switch (points) {
                    case "started" -> distance.setScale(0, RoundingMode.UP);
                    case "completed" -> distance.setScale(0, RoundingMode.DOWN);
                    case "majorFraction" -> distance.setScale(0, RoundingMode.HALF_DOWN);
                    default -> distance;
                };
                value = value.add(count.multiply(number(slope.get("perPoint"))));
            }
        }
        return value;
    }

    private @Nullable BigDecimal powerFactor(Map<String, Object> rule) {
        String window = rule.containsKey("in") ? rule.get("in") + "/" : "";
        Map<String, BigDecimal> f = figures;
        BigDecimal top = f.get(window + "energyKwh");
        BigDecimal bottom;
        switch ((String) rule.get("from")) {
            case "printed" -> {
                BigDecimal printed = f.get(window + "powerFactor");
                return printed == null ? null : roundedAboveZero(printed, rule);
            }
            case "kVAh" -> bottom = f.get(window + "apparentKvah");
            case "peak" -> {
                top = f.get(window + "peakKw");
                bottom = f.get(window + "peakKva");
            }
            default -> {
                BigDecimal lagging = f.get(window + "laggingKvarh");
                BigDecimal leading = f.get(window + "leadingKvarh");
                BigDecimal reactive = switch ((String) rule.getOrDefault("leading", "ignored")) {
                    case "added" -> lagging.add(leading);
                    case "netted" -> lagging.subtract(leading);
                    case "larger" -> lagging.max(leading);
                    default -> lagging;
                };
                bottom = top.pow(2).add(reactive.pow(2)).sqrt(DIGITS);
            }
        }
        return top.signum() == 0 || bottom.signum() == 0 ? null : roundedAboveZero(top.divide(bottom, DIGITS), rule);
    }

    private static BigDecimal roundedAboveZero(BigDecimal pf, Map<String, Object> rule) {
        BigDecimal rounded = round(pf, rule.get("round"), null);
        return rounded.signum() == 0 ? pf : rounded;
    }

    static BigDecimal round(BigDecimal value, @Nullable Object rounding) {
        return round(value, rounding, new BigDecimal("0.01"));
    }

    private static BigDecimal round(BigDecimal value, @Nullable Object written, @Nullable BigDecimal usual) {
        if ("not".equals(written) || (written == null && usual == null)) {
            return value;
        }
        Map<String, Object> rounding =
                written == null ? Map.of("to", java.util.Objects.requireNonNull(usual)) : map(written);
        BigDecimal to = number(rounding.get("to"));
        RoundingMode mode = switch ((String) rounding.getOrDefault("mode", "halfUp")) {
            case "halfDown" -> RoundingMode.HALF_DOWN;
            case "halfEven" -> RoundingMode.HALF_EVEN;
            case "up" -> RoundingMode.UP;
            case "down" -> RoundingMode.DOWN;
            default -> RoundingMode.HALF_UP;
        };
        BigDecimal steps = value.divide(to, DIGITS).setScale(60, RoundingMode.HALF_EVEN);
        return steps.setScale(0, mode).multiply(to);
    }

    static Map<String, Object> map(@Nullable Object written) {
        return (Map<String, Object>) java.util.Objects.requireNonNull(written);
    }

    static BigDecimal number(@Nullable Object written) {
        return (BigDecimal) java.util.Objects.requireNonNull(written);
    }
}
