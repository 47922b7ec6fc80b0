// SPDX-License-Identifier: Apache-2.0
package tariff.service.request;

import java.math.BigDecimal;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import tariff.meter.Site;
import tariff.meter.Unit;
import tariff.notice.Finding;
import tariff.rate.clause.Written;

/** A site in the parameters of a query: {@code site=North works&option=primary metered&agreed=kW:450}. */
final class SiteParameters {
    private SiteParameters() {}

    static Site read(Written in, List<Finding> findings) {
        Map<Unit, BigDecimal> agreed = new EnumMap<>(Unit.class);
        if (in.has("agreed")) {
            for (Written each : in.at("agreed").entries()) {
                String[] parts = each.text().split(":", 2);
                Optional<Unit> unit = Stream.of(Unit.values())
                        .filter(known -> known.symbol().equals(parts[0]))
                        .findFirst();
                if (unit.isEmpty() || parts.length < 2 || !parts[1].matches("\\d{1,12}(\\.\\d{1,6})?")) {
                    findings.add(Finding.error("agreed", each.pointer(), "is not a figure agreed with the utility")
                            .found(parts[0])
                            .allowed("a unit and a number, such as kW:450"));
                } else {
                    agreed.put(unit.get(), new BigDecimal(parts[1]));
                }
            }
        }
        Set<String> options = in.has("option") ? Set.copyOf(in.texts("option")) : Set.of();
        return new Site(in.optionalText("site").orElse(""), agreed, options);
    }
}
