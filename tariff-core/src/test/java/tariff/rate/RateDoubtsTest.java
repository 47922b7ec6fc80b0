// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.rate.Sheets.ENERGY;
import static tariff.rate.Sheets.check;
import static tariff.rate.Sheets.findings;
import static tariff.rate.Sheets.plain;
import static tariff.rate.Sheets.rate;
import static tariff.rate.Sheets.scheduled;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.bill.Bills;
import tariff.bill.Statement;
import tariff.notice.Finding;

/** What is allowed and may not be meant: the rate still bills, and says so. */
class RateDoubtsTest {

    private static void assertOnly(String sheet, String... messages) {
        assertThat(findings(sheet)).containsExactly(messages);
        assertThat(check(sheet).findings()).noneMatch(Finding::isError);
        assertThat(check(sheet).rate()).isPresent();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "'quantity': { 'peak': 'kW' }, 'price': 0.00 | asks nothing: it has no price but 0",
                "'quantity': { 'peak': 'kW' }, 'blocks': [ { 'upTo': 5, 'price': 0 }, { 'price': { 'blocks': [ { 'price': 0 } ] } } ] |"
                        + " asks nothing: it has no price but 0",
                "'percentOf': ['Energy'], 'percent': 0 | asks nothing: it takes 0 %",
                "'percentOf': ['Free'], 'percent': 6 | asks nothing: it is a percentage of lines that ask nothing (Free)",
                "'atLeast': { 'constant': 0, 'unit': 'money' }, 'of': ['Energy'] | asks nothing: a floor of 0 is always reached"
            })
    void aLineThatAsksNothingIsTold(String line, String message) {
        String sheet = plain(
                "",
                ENERGY,
                "{ 'name': 'Free', 'quantity': { 'energy': 'kWh' }, 'price': 0 }",
                "{ 'name': 'Line', " + line + " }");
        assertOnly(sheet, "/lines/1: asks nothing: it has no price but 0", "/lines/2: " + message);
    }

    @Test
    void aBlockAtThePriceOfTheOneBeforeIsTold() {
        assertOnly(
                plain(
                        "",
                        "{ 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'blocks': [ { 'upTo': 5, 'price': 0.10 }, { 'upTo': 9, 'price':"
                                + " 0.1 }, { 'price': 0.2 } ] }"),
                "/lines/0/blocks/1/price: is the price of the block before; the edge between them changes nothing");
    }

    @Test
    void whatIsDefinedAndNeverUsedIsTold() {
        assertOnly(
                rate(
                        "'windows': { 'day': { 'from': '07:00', 'to': '21:00' }, 'night': { 'from': '21:00', 'to': '07:00' } },"
                                + " 'seasons': { 'summer': { 'from': '06-01', 'to': '09-30' }, 'winter': { 'from': '10-01', 'to': '05-31' } },"
                                + " 'quantities': { 'a': { 'peak': 'kW', 'in': 'day' }, 'b': { 'largest': [ { 'peak': 'kW' }, { 'earlier':"
                                + " 'highest', 'of': 'b', 'months': 2 } ] }, 'c': 'b' },",
                        "{ 'name': 'Demand', 'quantity': { 'rounded': 'a', 'to': 1 }, 'price': 1 }"),
                "/powerFactors/billing: is a power factor that nothing in the rate uses",
                "/windows/night: is a window that nothing in the rate uses",
                "/quantities/c: is a quantity that nothing in the rate uses",
                "/seasons: are defined, but no price and no condition looks at them");
    }

    @Test
    void whatIsUsedInAConditionOrABlockEdgeIsUsed() {
        assertThat(
                        findings(
                                plain(
                                        "'quantities': { 'a': { 'peak': 'kW' }, 'b': { 'peak': 'kW' }, 'c': { 'energy': 'kWh' } }, 'seasons': { 'all year': {"
                                                + " 'from': '01-01', 'to': '12-31' } },",
                                        "{ 'name': 'Energy', 'when': { 'quantity': 'a', 'reaches': { 'constant': 5, 'unit': 'kW' } }, 'quantity': {"
                                                + " 'energy': 'kWh' }, 'blocks': [ { 'upTo': { 'hours': 100, 'of': 'b' }, 'price': 1 }, { 'price': 2 } ] }",
                                        "{ 'name': 'Floor', 'atLeast': { 'priced': 'c', 'at': 1 }, 'of': ['Energy'] }",
                                        "{ 'name': 'Summer', 'when': { 'not': { 'season': 'all year' } }, 'quantity': { 'constant': 1 }, 'price': 1 }")))
                .isEmpty();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                // no effect
                "'slopes': [ { 'below': 0.85, 'perPoint': 0 } ] | has no effect: it is 0 at every power factor",
                "'bands': [ { 'below': 0.85, 'value': 0 }, { 'value': 0.0 } ] | has no effect: it is 0 at every power factor",
                "'ratioTo': 0.95, 'below': 0 | has no effect: it is 0 at every power factor",
                "'ratioTo': 0.95, 'atMost': 0 | has no effect: it is 0 at every power factor",
                // cliffs
                "'bands': [ { 'below': 0.85, 'value': 12 }, { 'value': 0 } ] | jumps from 12 to 0 between power factor 0.8499 and 0.85",
                "'bands': [ { 'upTo': 0.85, 'value': 12 }, { 'value': 0 } ] | jumps from 12 to 0 between power factor 0.85 and 0.8501",
                "'bands': [ { 'below': 0.75, 'value': 20 }, { 'below': 0.85, 'value': 10 }, { 'value': 0 } ] | jumps from 20 to 10 between"
                        + " power factor 0.7499 and 0.75, the largest of 2 jumps",
                "'ratioTo': 1, 'onlyBelow': 0.96 | jumps from 4.177518 to 0 between power factor 0.9599 and 0.96",
                // the wrong way round
                "'slopes': [ { 'below': 0.85, 'perPoint': -1 } ] | goes up from -84 to -83 as the power factor improves from 0.01 to 0.02; a"
                        + " better power factor would cost more",
                "'slopes': [ { 'above': 0.85, 'perPoint': 1 } ] | goes up from 0 to 1 as the power factor improves from 0.85 to 0.86; a"
                        + " better power factor would cost more"
            })
    void aScheduleThatMayNotBeMeantIsTold(String schedule, String message) {
        assertOnly(scheduled(schedule), "/lines/1/schedule: " + message);
    }

    @Test
    void bandsTheWrongWayRoundRiseAndJump() {
        assertOnly(
                scheduled("'bands': [ { 'below': 0.85, 'value': 0 }, { 'value': 12 } ]"),
                "/lines/1/schedule: goes up from 0 to 12 as the power factor improves from 0.84 to 0.85; a better power factor would cost"
                        + " more",
                "/lines/1/schedule: jumps from 0 to 12 between power factor 0.8499 and 0.85");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "'slopes': [ { 'below': 0.85, 'perPoint': 1.5 }, { 'below': 0.75, 'perPoint': 3 } ]",
                "'slopes': [ { 'below': 0.95, 'perPoint': 1 } ], 'points': 'started'",
                "'slopes': [ { 'below': 0.95, 'perPoint': 1 } ], 'points': 'completed'",
                "'slopes': [ { 'below': 0.90, 'perPoint': 0.5 }, { 'above': 0.90, 'perPoint': -0.15 } ], 'atLeast': -0.75",
                "'ratioTo': 0.90, 'below': 60, 'above': 25, 'atLeast': -2.5, 'atMost': 120, 'round': { 'to': 0.1 }",
                "'bands': [ { 'below': 0.98, 'value': 2 }, { 'below': 0.99, 'value': 1 }, { 'value': 0 } ]"
            })
    void aSlopeOrAStaircaseOfPointsIsNoCliff(String schedule) {
        assertThat(findings(scheduled(schedule))).isEmpty();
    }

    @Test
    void anUnstatedRoundingOfThePowerFactorIsNoDoubtOfTheRate() {
        assertThat(findings(scheduled("'ratioTo': 0.95"))).isEmpty();
    }

    /** 200 h × 300 kW = 60,000 kWh, but the next block ends at 40,000; own arithmetic: 60,000 × 0.10 + 20,000 × 0.01. */
    @Test
    void anEdgeThatFallsInSomeMonthIsSaidOnTheStatement() {
        String sheet = plain(
                        "",
                        "{ 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'blocks': [ { 'upTo': { 'hours': 200, 'of': { 'peak': 'kW' } },"
                                + " 'price': 0.10 }, { 'upTo': 40000, 'price': 0.05 }, { 'price': 0.01 } ] }")
                .replace('\'', '"');
        Statement falls = Bills.bill(sheet, Bills.energies("80000", "0").with(tariff.meter.Register.PEAK_KW, 300));
        assertThat(falls.total()).isEqualTo("6200.00");
        assertThat(falls.assumptions())
                .extracting("code", "where", "message", "remedy")
                .containsExactly(org.assertj.core.groups.Tuple.tuple(
                        "block-edge-falls",
                        "2026-04",
                        "a block of kWh ends at 40000 kWh, before it begins at 60000 kWh; it is taken as empty",
                        "check the edges of the rate's blocks"));
        assertThat(Bills.bill(sheet, Bills.energies("80000", "0").with(tariff.meter.Register.PEAK_KW, 200))
                        .assumptions())
                .isEmpty();
    }
}
