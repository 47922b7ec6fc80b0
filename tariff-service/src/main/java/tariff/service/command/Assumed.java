// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import tariff.notice.Assumption;

/** Assumptions for people: each said once, with every place it was used in. */
final class Assumed {
    private static final int MOST_PLACES = 3;

    private Assumed() {}

    static List<String> text(List<Assumption> assumptions) {
        Map<String, Set<String>> places = new LinkedHashMap<>();
        assumptions.forEach(each -> places.computeIfAbsent(
                        each.message() + " (to remove it: " + each.remedy() + ")", message -> new LinkedHashSet<>())
                .add(each.where()));
        return places.entrySet().stream()
                .map(each -> places(List.copyOf(each.getValue())) + ": " + each.getKey())
                .toList();
    }

    private static String places(List<String> all) {
        return all.size() <= MOST_PLACES
                ? String.join(", ", all)
                : all.get(0) + " … " + all.get(all.size() - 1) + " (" + all.size() + " times)";
    }
}
