// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.util.List;

/**
 * A site and its bills.
 *
 * @param site what its contract says
 * @param months its billing periods by date, none overlapping another
 */
public record MeteredSite(Site site, List<MeteredMonth> months) {
    public MeteredSite {
        months = months.stream().sorted().toList();
    }
}
