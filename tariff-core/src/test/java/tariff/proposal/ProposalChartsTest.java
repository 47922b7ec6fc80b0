// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import tariff.bill.Billing;
import tariff.bill.Bills;
import tariff.chart.BillChart;
import tariff.chart.CashChart;
import tariff.chart.SavingsChart;
import tariff.correction.CapacitorBank;
import tariff.correction.Estimate;
import tariff.json.RateFile;
import tariff.meter.MeteredMonth;
import tariff.meter.Site;
import tariff.payback.Investment;
import tariff.payback.Outlook;

/** The base month, 120,000 kvarh, 400 kW and 300 kvar, alone or as a year; own arithmetic. */
class ProposalChartsTest {
    private static final String RATE = Bills.rate("""
            { 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'price': 0.10 },
            { 'name': 'Reactive demand', 'quantity': { 'excess': { 'peak': 'lagging kvar' },
              'over': { 'share': 0.5, 'of': { 'peak': 'kW' } } }, 'price': 8 }""");

    private static final Billing BILLING = new Billing(RateFile.parse(RATE), Site.unnamed());

    private static List<MeteredMonth> year() {
        return IntStream.rangeClosed(1, 12)
                .mapToObj(month -> MeteredMonth.of(String.format("2025-%02d", month))
                        .with(Bills.baseMonth().totals()))
                .toList();
    }

    private static Assessment assessment(String price) {
        return Assessment.of(
                BILLING,
                year(),
                new Proposal(
                        CapacitorBank.fixed("100"),
                        Optional.of(Investment.plain(new BigDecimal(price), BigDecimal.ZERO, 10)),
                        Outlook.level(new BigDecimal("0.08"))));
    }

    /** 1.2 × 300 kvar in 40 steps of 9 kvar; 200 of 400 kW are free, so the first 100 kvar save 8.00 each, and then nothing. */
    @Test
    void savingsBySizeStopWhereTheClauseDoes() {
        SavingsBySize bySize = SavingsBySize.of(BILLING, List.of(Bills.baseMonth()), 40);
        assertThat(bySize.sizes()).hasSize(41);
        assertThat(bySize.sizes().get(40).kvar()).isEqualByComparingTo("360");
        assertThat(bySize.sizes().get(0).total(Estimate.LOW)).isEqualByComparingTo("0");
        assertThat(bySize.sizes().get(11).total(Estimate.CENTRAL)).isEqualByComparingTo("792");
        assertThat(bySize.sizes().get(12).total(Estimate.CENTRAL)).isEqualByComparingTo("800");
        assertThat(bySize.stops(Estimate.CENTRAL)).hasSize(1);
        assertThat(bySize.stops(Estimate.CENTRAL).get(0).line()).isEqualTo("Reactive demand");
        assertThat(bySize.stops(Estimate.CENTRAL).get(0).kvar()).isEqualByComparingTo("108");
        SavingsChart chart = ProposalCharts.savings("Savings", bySize, Optional.of(new BigDecimal("150")));
        assertThat(chart.curves().get(1).name()).isEqualTo("central");
        assertThat(chart.curves().get(1).marked()).containsExactly(11);
        assertThat(chart.flags().get(0).words()).isEqualTo("Reactive demand stops paying at 108 kvar");
        assertThat(chart.flags().get(1).words()).isEqualTo("proposed: 150 kvar");
    }

    /** 300 kvar less 200 free × 8.00 = 800.00 a month, all of it reactive. */
    @Test
    void theBillChartHoldsTheBills() {
        BillChart chart = ProposalCharts.bill(assessment("4800"));
        assertThat(chart.title()).isEqualTo("Bills 2025-01 to 2025-12");
        assertThat(chart.months()).startsWith("Jan", "Feb").hasSize(12);
        assertThat(chart.lines().get(0).amounts()).containsOnly(16_000.0);
        assertThat(chart.lines().get(0).reactive()).containsOnly(0.0);
        assertThat(chart.lines().get(1).amounts()).containsOnly(800.0);
        assertThat(chart.lines().get(1).reactive()).containsOnly(800.0);
        assertThat(chart.svg()).contains("Mar, Reactive demand: 800.00, of which because of reactive load 800.00");
    }

    /** 4,800.00 ÷ 800.00 a month: paid back in month 6, and 91,200.00 ahead after ten years. */
    @Test
    void theCashChartMarksTheMonthOfPayback() {
        CashChart chart = ProposalCharts.cash(assessment("4800")).orElseThrow();
        assertThat(chart.curves().get(1).marked()).containsExactly(6);
        assertThat(chart.curves().get(1).values())
                .hasSize(121)
                .startsWith(-4800.0, -4000.0)
                .endsWith(91_200.0);
        assertThat(chart.svg()).contains("central: paid back in month 6");
    }

    @Test
    void withoutAPriceThereIsNoCashChart() {
        Assessment assessment = Assessment.of(BILLING, year(), Proposal.of(CapacitorBank.fixed("100")));
        assertThat(ProposalCharts.cash(assessment)).isEmpty();
    }

    @Test
    void aSmoothCurveHasNoKink() {
        assertThat(ProposalCharts.kinks(List.of(0.0, 10.0, 19.0, 27.0, 34.0, 40.0)))
                .isEmpty();
        assertThat(ProposalCharts.kinks(List.of(0.0, 10.0, 20.0, 20.0, 20.0))).containsExactly(2);
        assertThat(ProposalCharts.kinks(List.of(0.0))).isEmpty();
        assertThat(ProposalCharts.kinks(List.of(0.0, 0.0, 0.0))).isEmpty();
    }
}
