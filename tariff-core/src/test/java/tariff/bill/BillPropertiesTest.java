// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.bill.Bills.rate;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tariff.meter.MeteredMonth;
import tariff.meter.Register;
import tariff.meter.Site;

/** What holds of every bill; months are drawn from seeded generators. */
class BillPropertiesTest {
    private static final int DRAWS = 300;

    /** Every line of a kind that only ever penalises. */
    private static final String PENALTIES = """
            { 'name': 'kvarh', 'quantity': { 'energy': 'lagging kvarh' }, 'blocks': [ { 'upTo': { 'share': 0.33, 'of': { 'energy': 'kWh' } },
              'price': 0 }, { 'upTo': { 'share': 0.75, 'of': { 'energy': 'kWh' } }, 'price': 0.04 }, { 'price': 0.06 } ] },
            { 'name': 'cliff', 'quantity': { 'all': { 'energy': 'lagging kvarh' }, 'onceAbove': { 'share': 0.2, 'of': { 'energy': 'kWh' } } },
              'price': 0.02 },
            { 'name': 'banded', 'quantity': { 'excess': { 'energy': 'lagging kvarh' }, 'over': { 'share': 0.33, 'of': { 'energy': 'kWh' } } },
              'price': { 'bySchedule': { 'powerFactor': 'billing', 'bands': [ { 'below': 0.8, 'value': 0.06 }, { 'value': 0.04 } ] } } },
            { 'name': 'demand', 'quantity': { 'raised': { 'peak': 'kW' }, 'by': { 'powerFactor': 'billing', 'ratioTo': 0.95, 'atMost': 30 } },
              'price': 12 },
            { 'name': 'points', 'percentOf': ['demand'], 'schedule': { 'powerFactor': 'billing', 'points': 'started',
              'slopes': [ { 'below': 0.9, 'perPoint': 1 }, { 'below': 0.7, 'perPoint': 2 } ] } },
            { 'name': 'ratio', 'percentOf': ['demand'], 'schedule': { 'powerFactor': 'billing', 'ratioTo': 0.9, 'below': 60, 'atMost': 120,
              'round': { 'to': 0.1 } } }""";

    private static MeteredMonth month(Random random, int number) {
        return MeteredMonth.of(
                        java.time.YearMonth.of(2026, 1).plusMonths(number).toString())
                .with(Register.ENERGY_KWH, 1 + random.nextInt(200_000))
                .with(Register.LAGGING_KVARH, random.nextInt(200_000))
                .with(Register.PEAK_KW, 1 + random.nextInt(800));
    }

    @Test
    void moreLaggingKvarhNeverLowerAPenalty() {
        Random random = new Random(1);
        Billing billing = new Billing(tariff.json.RateFile.parse(rate(PENALTIES)), Site.unnamed());
        for (int i = 0; i < DRAWS; i++) {
            MeteredMonth less = month(random, 0);
            BigDecimal kvarh = less.totals().get(Register.LAGGING_KVARH).orElseThrow();
            MeteredMonth more = less.with(
                    Register.LAGGING_KVARH, kvarh.longValueExact() + 1 + random.nextInt(chance(random) ? 10 : 50_000));
            Statement before = billing.statements(List.of(less)).get(0);
            Statement after = billing.statements(List.of(more)).get(0);
            for (StatementLine line : before.lines()) {
                assertThat(after.amount(line.name()))
                        .as("%s of %s and %s", line.name(), less, more)
                        .isGreaterThanOrEqualTo(line.amount());
            }
        }
    }

    private static boolean chance(Random random) {
        return random.nextBoolean();
    }

    @Test
    void theLinesThatCountAddUpToTheTotal() {
        for (int seed = 0; seed < DRAWS; seed++) {
            RandomRates random = new RandomRates(10_000 + seed);
            Billing billing =
                    new Billing(tariff.json.RateFile.parse(random.rate()), Bills.agreed(tariff.meter.Unit.KW, "450"));
            List<MeteredMonth> months =
                    random.months().stream().map(DifferentialTest::metered).toList();
            for (Statement statement : billing.statements(months)) {
                BigDecimal sum = statement.lines().stream()
                        .filter(line -> !line.shownOnly())
                        .map(StatementLine::amount)
                        .reduce(BigDecimal.ZERO, BigDecimal::add);
                assertThat(billing.rate().definition().roundTotal().apply(sum)).isEqualByComparingTo(statement.total());
            }
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"2", "0.5", "1.1", "-1"})
    void pricesTimesAFactorGiveLinesTimesTheFactor(String factor) {
        BigDecimal k = new BigDecimal(factor);
        String unrounded = "'roundLines': \"not\", 'roundTotal': { 'to': 0.0000000001 },";
        Random random = new Random(2);
        for (int i = 0; i < DRAWS / 3; i++) {
            MeteredMonth month = month(random, 0);
            Statement plain = Bills.bill(rate("'billing': { 'from': 'energies' }", unrounded, PENALTIES), month);
            Statement scaled = Bills.bill(rate("'billing': { 'from': 'energies' }", unrounded, scaled(k)), month);
            for (StatementLine line : plain.lines()) {
                assertThat(scaled.amount(line.name())
                                .subtract(line.amount().multiply(k))
                                .abs())
                        .as("%s × %s of %s", line.name(), k, month)
                        .isLessThan(new BigDecimal("1e-20"));
            }
        }
    }

    /** Every price of the penalties above, in blocks, bands of prices and lines, times k; percentages stay. */
    private static String scaled(BigDecimal k) {
        String out = java.util.regex.Pattern.compile("'price': (\\d[\\d.]*)")
                .matcher(PENALTIES)
                .replaceAll(found ->
                        "'price': " + new BigDecimal(found.group(1)).multiply(k).toPlainString());
        return java.util.regex.Pattern.compile("'value': (\\d[\\d.]*)")
                .matcher(out)
                .replaceAll(found ->
                        "'value': " + new BigDecimal(found.group(1)).multiply(k).toPlainString());
    }

    @Test
    void splittingABlockAtAnInnerEdgeChangesNothing() {
        Random random = new Random(3);
        for (int i = 0; i < DRAWS; i++) {
            int inner = 1 + random.nextInt(99_999);
            String whole =
                    "{ 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'blocks': [ { 'upTo': 100000, 'price': 0.1 }, { 'price': 0.07 } ] }";
            String split = whole.replace("[ {", "[ { 'upTo': " + inner + ", 'price': 0.1 }, {");
            MeteredMonth month = month(random, 0);
            assertThat(Bills.bill(rate(split), month).total())
                    .as("split at %s, %s", inner, month)
                    .isEqualTo(Bills.bill(rate(whole), month).total());
        }
    }

    @Test
    void theOrderInWhichMonthsAreGivenChangesNothing() {
        String ratchet = rate("""
                { 'name': 'Demand', 'quantity': { 'largest': [ { 'peak': 'kW' }, { 'share': 0.8, 'of': { 'earlier': 'highest', 'of': {
                  'peak': 'kW' }, 'months': 5 } } ] }, 'price': 10 }""");
        Random random = new Random(4);
        for (int i = 0; i < DRAWS / 10; i++) {
            List<MeteredMonth> months = new ArrayList<>();
            for (int number = 0; number < 12; number++) {
                months.add(month(random, number));
            }
            List<Statement> inOrder = Bills.bill(ratchet, Site.unnamed(), months);
            Collections.shuffle(months, random);
            assertThat(Bills.bill(ratchet, Site.unnamed(), months)).isEqualTo(inOrder);
        }
    }
}
