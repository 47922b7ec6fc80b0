// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.math.BigDecimal;
import java.util.Collections;
import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;

/**
 * What a contract says of the place that is billed.
 *
 * @param name what its owner calls it
 * @param agreed figures agreed with the utility, such as a contract demand, at most one for each unit
 * @param options what holds for the site, in the words of the rate: {@code primary metered}
 */
public record Site(String name, Map<Unit, BigDecimal> agreed, Set<String> options) {
    public Site {
        EnumMap<Unit, BigDecimal> copy = new EnumMap<>(Unit.class);
        copy.putAll(agreed);
        agreed = Collections.unmodifiableMap(copy);
        options = Collections.unmodifiableSet(new TreeSet<>(options));
    }

    public static Site unnamed() {
        return new Site("", Map.of(), Set.of());
    }

    public Optional<BigDecimal> agreed(Unit unit) {
        return Optional.ofNullable(agreed.get(unit));
    }
}
