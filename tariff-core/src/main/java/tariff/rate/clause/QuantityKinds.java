// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.Function;

/** The kinds of quantity by the key that a rate file writes them with. A new kind needs a line here and nowhere else. */
public final class QuantityKinds {
    private static final Map<String, Function<Written, Quantity>> READERS = new TreeMap<>(Map.ofEntries(
            Map.entry("agreed", Agreed::read),
            Map.entry("all", AllOnceAbove::read),
            Map.entry("amount", AmountOf::read),
            Map.entry("constant", Constant::read),
            Map.entry("days", Days::read),
            Map.entry("each", Each::read),
            Map.entry("earlier", Earlier::read),
            Map.entry("energy", Energy::read),
            Map.entry("excess", Excess::read),
            Map.entry("hours", HoursOf::read),
            Map.entry("largest", Largest::read),
            Map.entry("peak", Peak::read),
            Map.entry("priced", Priced::read),
            Map.entry("prorated", Prorated::read),
            Map.entry("raised", Raised::read),
            Map.entry("rounded", Rounded::read),
            Map.entry("share", Share::read),
            Map.entry("smallest", Smallest::read),
            Map.entry("sum", Sum::read)));

    private QuantityKinds() {}

    /** The keys, in alphabetical order. */
    public static List<String> keys() {
        return List.copyOf(READERS.keySet());
    }

    /** A name in quotes, or an object with exactly one kind's key. */
    public static Quantity read(Written in) {
        if (in.isText()) {
            return new Named(in.text());
        }
        if (!in.isObject()) {
            in.wrong(
                    "type",
                    "must be a quantity",
                    "the name of a quantity in quotes, or an object with one of: " + allowed());
            return Quantity.unreadable();
        }
        List<String> kinds = in.keys().stream().filter(READERS::containsKey).toList();
        if (kinds.size() != 1) {
            return refuse(in, kinds);
        }
        Quantity quantity = reader(kinds.get(0)).apply(in);
        in.refuseOtherKeys();
        return quantity;
    }

    private static Quantity refuse(Written in, List<String> kinds) {
        String hint = in.keys().stream()
                .map(key -> Nearest.hint(key, READERS.keySet()))
                .max(Comparator.comparingInt(String::length))
                .orElse("");
        in.wrongAs(
                "quantity",
                kinds.isEmpty() ? "says no kind of quantity" + hint : "says several kinds of quantity at once",
                in.keys().isEmpty() ? "{}" : Nearest.list(kinds.isEmpty() ? in.keys() : kinds),
                allowed());
        return Quantity.unreadable();
    }

    private static Function<Written, Quantity> reader(String kind) {
        return java.util.Objects.requireNonNull(READERS.get(kind));
    }

    private static String allowed() {
        return String.join(", ", READERS.keySet());
    }
}
