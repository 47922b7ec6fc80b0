// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import tariff.notice.Assumption;

/** Assumptions for people: those that differ in a number alone are said once, in the words of the first, with every place. */
final class Assumed {
    private static final int MOST_PLACES = 3;

    private Assumed() {}

    static List<String> text(List<Assumption> assumptions) {
        Map<String, Assumption> first = new LinkedHashMap<>();
        Map<String, Set<String>> places = new LinkedHashMap<>();
        for (Assumption each : assumptions) {
            String kind = each.code() + each.message().replaceAll("\\d+", "#");
            first.putIfAbsent(kind, each);
            places.computeIfAbsent(kind, message -> new LinkedHashSet<>()).add(each.where());
        }
        return first.entrySet().stream()
                .map(each -> places(List.copyOf(places.getOrDefault(each.getKey(), Set.of()))) + ": "
                        + each.getValue().message()
                        + remedy(each.getValue().remedy()))
                .toList();
    }

    private static String remedy(String remedy) {
        return remedy.startsWith("none") ? "" : " (to remove it: " + remedy + ")";
    }

    private static String places(List<String> all) {
        return all.size() <= MOST_PLACES
                ? String.join(", ", all)
                : all.get(0) + " … " + all.get(all.size() - 1) + " (" + all.size() + " times)";
    }
}
