// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import tariff.rate.clause.Written;

/** placeholder until windows land. */
public record WindowClause(String words) {
    static WindowClause read(Written in) {
        in.keys().forEach(in::has);
        return new WindowClause("");
    }

    public java.math.BigDecimal hours(tariff.meter.Period period) {
        return java.math.BigDecimal.valueOf(12L * period.days());
    }
}
