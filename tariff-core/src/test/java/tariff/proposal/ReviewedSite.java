// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.LAGGING_KVARH;
import static tariff.meter.Register.LEADING_KVARH;
import static tariff.meter.Register.PEAK_KVA;
import static tariff.meter.Register.PEAK_KW;
import static tariff.meter.Register.PEAK_LAGGING_KVAR;

import java.util.List;
import java.util.stream.IntStream;
import tariff.meter.MeteredMonth;

/** An invented site whose twelve months are alike: power factor 0.80, whether by month or at the peak. */
final class ReviewedSite {
    private ReviewedSite() {}

    /** 160,000 kWh, 120,000 kvarh, 400 kW, 300 kvar, 500 kVA in every month of 2025. */
    static List<MeteredMonth> year() {
        return IntStream.rangeClosed(1, 12)
                .mapToObj(number -> MeteredMonth.of(String.format("2025-%02d", number))
                        .with(ENERGY_KWH, 160_000)
                        .with(LAGGING_KVARH, 120_000)
                        .with(LEADING_KVARH, 0)
                        .with(PEAK_KW, 400)
                        .with(PEAK_KVA, 500)
                        .with(PEAK_LAGGING_KVAR, 300))
                .toList();
    }
}
