// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import tariff.meter.Register;
import tariff.meter.Triangle;
import tariff.meter.Unit;

/**
 * A power factor as a clause defines it: {@code { "from": "energies", "leading": "ignored", "round": { "to": 0.01 } }}. A month without
 * energy has none, and what depends on it does not apply.
 *
 * @param from the registers it is worked out from
 * @param window the window whose registers are used, the whole period if empty
 * @param leading what leading kvarh do to it, where it comes from energies
 * @param round how the rate rounds it before use
 */
public record PowerFactorRule(From from, Optional<String> window, Leading leading, Optional<Rounding> round) {

    /** The registers a power factor is worked out from. */
    public enum From {
        /** kWh ÷ √(kWh² + kvarh²) of the period. */
        ENERGIES("energies", "from the period's kWh and kvarh", Register.ENERGY_KWH, Register.LAGGING_KVARH),
        /** kWh ÷ kVAh; never above the one from energies. */
        APPARENT("kVAh", "kWh ÷ kVAh", Register.ENERGY_KWH, Register.APPARENT_KVAH),
        /** Highest kW ÷ highest kVA. */
        PEAK("peak", "highest kW ÷ highest kVA", Register.PEAK_KW, Register.PEAK_KVA),
        /** As printed on the bill. */
        PRINTED("printed", "as printed on the bill", Register.POWER_FACTOR);

        private final String key;
        private final String words;
        private final Set<Register> registers;

        From(String key, String words, Register... registers) {
            this.key = key;
            this.words = words;
            this.registers = Set.of(registers);
        }
    }

    /** What leading kvarh do to a power factor from energies. */
    public enum Leading {
        IGNORED("ignored", "leading kvarh ignored"),
        ADDED("added", "leading kvarh added to lagging"),
        NETTED("netted", "leading kvarh taken from lagging"),
        LARGER("larger", "the larger of lagging and leading kvarh");

        private final String key;
        private final String words;

        Leading(String key, String words) {
            this.key = key;
            this.words = words;
        }
    }

    private static final Map<String, From> FROM = new LinkedHashMap<>();
    private static final Map<String, Leading> LEADING = new LinkedHashMap<>();

    static {
        for (From from : From.values()) {
            FROM.put(from.key, from);
        }
        for (Leading leading : Leading.values()) {
            LEADING.put(leading.key, leading);
        }
    }

    public static PowerFactorRule read(Written in) {
        PowerFactorRule rule = new PowerFactorRule(
                in.requiredWord("from", FROM, From.ENERGIES),
                in.optionalText("in"),
                in.word("leading", LEADING, Leading.IGNORED),
                Rounding.readOptional(in, "round"));
        in.refuseOtherKeys();
        return rule;
    }

    /** The registers it is worked out from, leading kvarh aside. */
    public Set<Register> registers() {
        return from.registers;
    }

    public void check(Scope scope) {
        scope.checkWindow(window);
        if (from != From.ENERGIES && leading != Leading.IGNORED) {
            scope.at("leading")
                    .error("leading", "says what leading kvarh do, but the power factor does not come from energies");
        }
    }

    /** The month's power factor, empty without energy. */
    public Optional<Figure> value(Facts facts) {
        return switch (from) {
            case ENERGIES -> fromEnergies(facts);
            case APPARENT -> ratio(facts, Register.ENERGY_KWH, Register.APPARENT_KVAH);
            case PEAK -> ratio(facts, Register.PEAK_KW, Register.PEAK_KVA);
            case PRINTED -> printed(facts);
        };
    }

    /** A bill for a month without energy prints no power factor, and none may be asked for. */
    private Optional<Figure> printed(Facts facts) {
        boolean idle = !facts.has(Register.POWER_FACTOR, window)
                && facts.has(Register.ENERGY_KWH, window)
                && facts.register(Register.ENERGY_KWH, window).value().signum() == 0;
        return idle ? Optional.empty() : rounded(facts.register(Register.POWER_FACTOR, window));
    }

    private Optional<Figure> fromEnergies(Facts facts) {
        Figure active = facts.register(Register.ENERGY_KWH, window);
        Figure reactive = reactive(facts);
        BigDecimal apparent = Triangle.apparent(active.value(), reactive.value());
        if (active.value().signum() == 0) {
            return Optional.empty();
        }
        BigDecimal pf = Triangle.powerFactor(active.value(), apparent);
        return rounded(Figure.of(pf, Unit.NUMBER, "{} ÷ √({}² + {}²)", active, active, reactive));
    }

    private Figure reactive(Facts facts) {
        Figure lagging = facts.register(Register.LAGGING_KVARH, window);
        if (leading == Leading.IGNORED) {
            return lagging;
        }
        Figure sent = facts.register(Register.LEADING_KVARH, window);
        return switch (leading) {
            case ADDED -> Figure.of(lagging.value().add(sent.value()), Unit.KVARH, "{} + {}", lagging, sent);
            case NETTED -> Figure.of(lagging.value().subtract(sent.value()), Unit.KVARH, "{} − {}", lagging, sent);
            default -> lagging.value().compareTo(sent.value()) >= 0 ? lagging : sent;
        };
    }

    private Optional<Figure> ratio(Facts facts, Register active, Register apparent) {
        Figure top = facts.register(active, window);
        Figure bottom = facts.register(apparent, window);
        if (top.value().signum() == 0 || bottom.value().signum() == 0) {
            return Optional.empty();
        }
        BigDecimal pf = Triangle.powerFactor(top.value(), bottom.value());
        return rounded(Figure.of(pf, Unit.NUMBER, "{} ÷ {}", top, bottom));
    }

    /** One so low that it would round to nothing stays as it is; one of nothing at all is none. */
    private Optional<Figure> rounded(Figure powerFactor) {
        return Optional.of(powerFactor)
                .filter(PowerFactorRule::isAboveZero)
                .map(figure -> round.map(rounding -> rounding.apply(figure))
                        .filter(PowerFactorRule::isAboveZero)
                        .orElse(figure));
    }

    private static boolean isAboveZero(Figure figure) {
        return figure.value().signum() > 0;
    }

    public String words() {
        return from.words
                + window.map(name -> " in " + name).orElse("")
                + (from == From.ENERGIES ? ", " + leading.words : "")
                + round.map(rounding -> ", " + rounding.words()).orElse(", not rounded");
    }
}
