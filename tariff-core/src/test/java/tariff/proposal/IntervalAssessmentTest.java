// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.BitSet;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tariff.bill.Billing;
import tariff.bill.Bills;
import tariff.correction.CapacitorBank;
import tariff.correction.Controller;
import tariff.correction.Estimate;
import tariff.json.RateFile;
import tariff.meter.IntervalSeries;
import tariff.meter.MeteredMonth;
import tariff.meter.MonthlySums;
import tariff.meter.Site;

/** What a bank does interval by interval must lie within what the month's totals promised. */
class IntervalAssessmentTest {
    /** The series gives kVA to 0.01, before and after: 0.01 kVA at 10 each. */
    private static final BigDecimal METER_ROUNDING = new BigDecimal("0.10");

    private static final List<String> RATES = List.of(
            Bills.rate("{ 'name': 'Demand', 'quantity': { 'peak': 'kVA' }, 'price': 10 }"),
            Bills.rate(
                    "{ 'name': 'Reactive', 'quantity': { 'energy': 'lagging kvarh' }, 'blocks': [ { 'upTo': { 'share': 0.33, 'of': {"
                            + " 'energy': 'kWh' } }, 'price': 0 }, { 'price': 0.04 } ] }, { 'name': 'Leading', 'quantity': { 'energy': 'leading"
                            + " kvarh' }, 'price': 0.02 }"),
            Bills.rate(
                    "{ 'name': 'Demand', 'quantity': { 'raised': { 'peak': 'kW' }, 'by': { 'powerFactor': 'billing', 'ratioTo': 0.95 } },"
                            + " 'price': 12 }"));

    /** A plant with shifts, weekends, and a reactive load of its own shape; quarter-hours, two months. */
    private static IntervalSeries plant(long seed) {
        Random random = new Random(seed);
        int size = 59 * 96;
        long[] kwh = new long[size];
        long[] lagging = new long[size];
        int night = 500 + random.nextInt(3000);
        int day = 3000 + random.nextInt(6000);
        for (int i = 0; i < size; i++) {
            boolean shift = i / 4 % 24 >= 6 && i / 4 % 24 < 6 + 8 * (seed % 3 + 1) && i / 96 % 7 < 5;
            kwh[i] = (shift ? day : night) + random.nextInt(1000);
            lagging[i] = (shift ? day * 3L / 4 : night / 2) + random.nextInt(1000);
        }
        return new IntervalSeries(
                Instant.parse("2025-01-01T00:00:00Z"),
                15,
                ZoneOffset.UTC,
                2,
                kwh,
                lagging,
                new long[size],
                Optional.empty(),
                new BitSet());
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
    void theTruthLiesWithinTheBoundsOfTheMonthsTotals(long seed) {
        MonthlySums sums = MonthlySums.of(plant(seed));
        List<MeteredMonth> months = sums.months();
        for (String text : RATES) {
            Billing billing = new Billing(RateFile.parse(text), Site.unnamed());
            for (String kvar : List.of("10", "40", "90", "160", "300")) {
                for (CapacitorBank bank :
                        List.of(CapacitorBank.fixed(kvar), CapacitorBank.automatic(kvar, kvar), mixed(kvar))) {
                    Assessment exact = Assessment.of(billing, sums, Proposal.of(bank));
                    Assessment bounds = Assessment.of(billing, months, Proposal.of(bank));
                    for (int month = 0; month < months.size(); month++) {
                        BigDecimal truth = exact.savings(Estimate.CENTRAL)
                                .settledYearMonths()
                                .get(month);
                        assertThat(truth)
                                .as("%s, %s", text, bank)
                                .isBetween(
                                        bounds.savings(Estimate.LOW)
                                                .settledYearMonths()
                                                .get(month)
                                                .subtract(METER_ROUNDING),
                                        bounds.savings(Estimate.HIGH)
                                                .settledYearMonths()
                                                .get(month)
                                                .add(METER_ROUNDING));
                    }
                }
            }
        }
    }

    private static CapacitorBank mixed(String kvar) {
        return CapacitorBank.plain(new BigDecimal(kvar), List.of(new BigDecimal(kvar)))
                .withController(Controller.aimingAt(new BigDecimal("0.98")));
    }
}
