// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.List;
import org.junit.jupiter.api.Test;
import tariff.bill.Billing;
import tariff.bill.Bills;
import tariff.bill.LineCost;
import tariff.correction.Estimate;
import tariff.json.RateFile;
import tariff.meter.MeteredMonth;
import tariff.meter.Site;

/** The base month, 160,000 kWh, 120,000 kvarh, 400 kW and 500 kVA, under three clauses at once; own arithmetic. */
class ClauseEffectsTest {
    private static final String RATE = Bills.rate("""
            { 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'price': 0.10 },
            { 'name': 'Demand', 'quantity': { 'peak': 'kVA' }, 'price': 10 },
            { 'name': 'Reactive energy', 'quantity': { 'energy': 'lagging kvarh' }, 'blocks': [
              { 'upTo': { 'share': 0.33, 'of': { 'energy': 'kWh' } }, 'price': 0 }, { 'price': 0.04 } ] },
            { 'name': 'Tax', 'percentOf': 'all above', 'percent': 10 }""");

    private static ClauseEffects effects(String kvar) {
        MeteredMonth may = MeteredMonth.of("2026-05").with(Bills.baseMonth().totals());
        return ClauseEffects.of(
                new Billing(RateFile.parse(RATE), Site.unnamed()),
                List.of(may, Bills.baseMonth()),
                new BigDecimal(kvar));
    }

    /**
     * To unity the demand falls by 100 kVA = 1,000.00, the reactive energy by 67,200 × 0.04 = 2,688.00, the tax by a tenth of both. Without
     * penalty the demand stays, as only the kvarh clause names a point.
     */
    @Test
    void eachLineSaysWhatItCosts() {
        ClauseEffects effects = effects("50");
        assertThat(effects.months()).hasSize(2);
        assertThat(effects.months().get(0).period()).hasToString("2026-04");
        assertThat(effects.months().get(0).lines())
                .usingRecursiveComparison()
                .withComparatorForType(BigDecimal::compareTo, BigDecimal.class)
                .isEqualTo(List.of(
                        cost("Energy", "16000", "0", "0"),
                        cost("Demand", "5000", "0", "1000"),
                        cost("Reactive energy", "2688", "2688", "2688"),
                        cost("Tax", "2368.80", "268.80", "368.80")));
        assertThat(effects.biting()).extracting(LineCost::line).containsExactly("Reactive energy", "Demand", "Tax");
        assertThat(effects.lines().get(2).penalty()).isEqualByComparingTo("5376.00");
    }

    /** kvarh at 0.81 are 160,000 × 0.723987… = 115,838.06: 166.48 less; kVA 493.83: 61.73 less; with tax 1.1 × 228.21 = 251.03. */
    @Test
    void theNextPointMovesEveryBasis() {
        ClauseEffects effects = effects("50");
        assertThat(effects.months().get(0).ahead().nextPoint()).isEqualByComparingTo("251.03");
        assertThat(effects.nextPoint()).isEqualByComparingTo("502.06");
    }

    /** High: 36,000 kvarh × 0.04 and 50 kVA × 10, × 1.1 = 2,134.00. Low: 20,000 kvarh; demand √(400² + 250²) × 10 = 4,716.99; 1,083.01 + 108.30. */
    @Test
    void theNextFiftyKvarAreWorthWhatTheBankIs() {
        ClauseEffects.Month april = effects("50").months().get(0);
        assertThat(april.nextBank().get(Estimate.HIGH)).isEqualByComparingTo("2134.00");
        assertThat(april.nextBank().get(Estimate.LOW)).isEqualByComparingTo("1191.31");
        assertThat(april.nextBank().get(Estimate.CENTRAL)).isBetween(new BigDecimal("1191.31"), new BigDecimal("2134"));
    }

    @Test
    void noKvarSaveNothing() {
        for (Estimate estimate : Estimate.values()) {
            assertThat(effects("0").nextBank(estimate)).isEqualByComparingTo("0");
        }
    }

    /** The kVA fall all the way to unity, where 400 kW × 0.75 = 300 kvar are gone. */
    @Test
    void theLastMonthToFlattenNeedsAllKvar() {
        assertThat(effects("50")
                        .lastToFlatten()
                        .orElseThrow()
                        .ahead()
                        .flat()
                        .orElseThrow()
                        .kvar()
                        .orElseThrow())
                .isEqualByComparingTo("300");
    }

    @Test
    void linesAddUpToWhatTheMonthCosts() {
        ClauseEffects effects = effects("50");
        assertThat(effects.lines().stream().map(LineCost::toUnity).reduce(BigDecimal.ZERO, BigDecimal::add))
                .isEqualByComparingTo("8113.60");
    }

    private static LineCost cost(String line, String asItIs, String penalty, String toUnity) {
        return new LineCost(line, new BigDecimal(asItIs), new BigDecimal(penalty), new BigDecimal(toUnity), false);
    }
}
