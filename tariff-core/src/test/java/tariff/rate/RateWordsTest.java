// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.rate.Sheets.ENERGY;
import static tariff.rate.Sheets.plain;
import static tariff.rate.Sheets.scheduled;
import static tariff.rate.Sheets.words;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** A rate read back: what each kind of clause says of itself. */
class RateWordsTest {

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "{ 'energy': 'kWh' } | kWh, at 2 per kWh",
                "{ 'energy': 'lagging kvarh', 'in': 'day' } | lagging kvarh in day, at 2 per kvarh",
                "{ 'peak': 'kVA' } | highest kVA, at 2 per kVA",
                "{ 'agreed': 'kW' } | agreed kW, at 2 per kW",
                "{ 'days': 'period' } | days billed, at 2 per day",
                "{ 'constant': 1 } | 2 per period",
                "{ 'constant': 50, 'unit': 'kVA' } | 50 kVA, at 2 per kVA",
                "{ 'share': 0.33, 'of': { 'energy': 'kWh' } } | 33 % of the kWh, at 2 per kWh",
                "{ 'hours': 200, 'of': { 'peak': 'kW' } } | 200 hours of the highest kW, at 2 per kWh",
                "{ 'sum': [ { 'energy': 'kWh' }, { 'energy': 'exported kWh' } ] } | kWh plus the exported kWh, at 2 per kWh",
                "{ 'largest': [ { 'peak': 'kW' }, { 'share': 0.95, 'of': { 'peak': 'kVA' } } ] } | largest of (the highest kW; 95 % of the"
                        + " highest kVA), at 2 per kW",
                "{ 'smallest': [ { 'peak': 'kW' }, { 'agreed': 'kW' } ] } | smallest of (the highest kW; the agreed kW), at 2 per kW",
                "{ 'excess': { 'peak': 'lagging kvar' }, 'over': { 'share': 0.6197, 'of': { 'peak': 'kW' } } } | highest lagging kvar above"
                        + " 61.97 % of the highest kW, at 2 per kvar",
                "{ 'all': { 'energy': 'leading kvarh' }, 'onceAbove': { 'share': 0.15, 'of': { 'energy': 'kWh' } } } | all of the leading"
                        + " kvarh once above 15 % of the kWh, at 2 per kvarh",
                "{ 'rounded': { 'peak': 'kW' }, 'to': 1 } | highest kW, rounded half up to a whole number, at 2 per kW",
                "{ 'rounded': { 'peak': 'kW' }, 'to': 0.1, 'mode': 'down' } | highest kW, cut off to 0.1, at 2 per kW",
                "{ 'prorated': { 'agreed': 'kVA' }, 'perDays': 1 } | agreed kVA for each day billed, at 2 per kVA",
                "{ 'prorated': { 'constant': 5000, 'unit': 'kWh' }, 'perDays': 30, 'unlessDays': [25, 35] } | 5000 kWh × days billed ÷ 30"
                        + " (not in a period of 25 to 35 days), at 2 per kWh",
                "{ 'earlier': 'highest', 'of': { 'peak': 'kW' }, 'months': 11, 'onlyIn': [6, 7] } | highest value of the highest kW in"
                        + " the previous 11 months (only June, July), at 2 per kW",
                "{ 'earlier': 'sum', 'of': { 'energy': 'kWh' }, 'since': 4 } | sum of the kWh in the months since April, at 2 per kWh",
                "{ 'amount': ['Energy'] } | amount of Energy, at 2 per unit of money",
                "{ 'priced': { 'agreed': 'kW' }, 'at': 4.10 } | agreed kW at 4.10 per unit, at 2 per unit of money",
                "{ 'each': 'hour', 'take': 'sum', 'of': { 'energy': 'kWh' } } | sum, over each hour, of the kWh, at 2 per kWh",
                // what runs on past its noun stands in brackets inside another
                "{ 'excess': { 'rounded': { 'peak': 'kW' }, 'to': 1 }, 'over': { 'constant': 50, 'unit': 'kW' } } | (the highest kW,"
                        + " rounded half up to a whole number) above 50 kW, at 2 per kW",
                "{ 'rounded': { 'excess': { 'peak': 'kW' }, 'over': { 'constant': 50, 'unit': 'kW' } }, 'to': 1 } | (the highest kW"
                        + " above 50 kW), rounded half up to a whole number, at 2 per kW",
                "{ 'share': 0.5, 'of': { 'sum': [ { 'energy': 'kWh' }, { 'energy': 'exported kWh' } ] } } | 50 % of (the kWh plus the"
                        + " exported kWh), at 2 per kWh",
                "{ 'sum': [ { 'share': 0.5, 'of': { 'energy': 'kWh' } }, { 'energy': 'exported kWh' } ] } | 50 % of the kWh plus the"
                        + " exported kWh, at 2 per kWh",
                "'demand' | demand, at 2 per kW"
            })
    void aQuantityIsANoun(String quantity, String words) {
        String sheet = plain(
                "'windows': { 'day': { 'from': '07:00', 'to': '21:00' } }, 'quantities': { 'demand': { 'peak': 'kW' } },",
                ENERGY,
                "{ 'name': 'Line', 'quantity': " + quantity + ", 'price': 2 }");
        assertThat(words(sheet).lines().get(1)).isEqualTo("Line: " + words + ".");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "'price': 0.0420 | kWh, at 0.0420 per kWh",
                "'price': { 'bySeason': { 'summer': 3, 'winter': 2 } } | kWh, at 3 per kWh in summer, 2 per kWh in winter",
                "'price': { 'byDate': [ { 'from': '2026-01-01', 'price': 1 }, { 'from': '2026-04-13', 'price': 2 } ] } | kWh, at 1 per kWh"
                        + " from 2026-01-01, 2 per kWh from 2026-04-13 (a period that holds a change is split by days)",
                "'blocks': [ { 'upTo': 50, 'price': 0 }, { 'price': 2 } ] | kWh above 50 kWh, at 2 per kWh",
                "'blocks': [ { 'upTo': 50, 'price': 1 }, { 'upTo': 90, 'price': 2 }, { 'price': 3 } ] | kWh: up to 50 kWh at 1 per kWh, then"
                        + " up to 90 kWh at 2 per kWh, the rest at 3 per kWh",
                "'price': 1, 'when': { 'option': 'primary metered' } | kWh, at 1 per kWh, only if the site is marked \"primary metered\"",
                "'price': 1, 'when': { 'not': { 'season': 'summer' } } | kWh, at 1 per kWh, unless most of the period lies in summer",
                "'price': 1, 'when': { 'quantity': { 'peak': 'kW' }, 'reaches': { 'constant': 15, 'unit': 'kW' } } | kWh, at 1 per kWh,"
                        + " only if the highest kW is at least 15 kW",
                "'price': 1, 'when': { 'quantity': { 'peak': 'kW' }, 'exceeds': { 'constant': 15, 'unit': 'kW' } } | kWh, at 1 per kWh,"
                        + " only if the highest kW is above 15 kW",
                "'price': 1, 'round': { 'to': 1, 'mode': 'up' }, 'shownOnly': true | kWh, at 1 per kWh; rounded up to a whole number; shown"
                        + " only, not part of the total"
            })
    void aPriceAndAConditionFollow(String price, String words) {
        String sheet = plain(
                "'seasons': { 'summer': { 'from': '06-01', 'to': '09-30' }, 'winter': { 'from': '10-01', 'to': '05-31' } },",
                "{ 'name': 'Line', 'quantity': { 'energy': 'kWh' }, " + price + " }");
        assertThat(words(sheet).lines()).containsExactly("Line: " + words + ".");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "'slopes': [ { 'below': 0.85, 'perPoint': 1.5 }, { 'below': 0.75, 'perPoint': 3 } ] | 1.5 % for each 0.01 (parts in"
                        + " proportion) that the billing power factor is below 0.85 down to 0.75, then 3 % for each 0.01 (parts in"
                        + " proportion) that the billing power factor is below 0.75",
                "'slopes': [ { 'below': 0.95, 'perPoint': 1 } ], 'points': 'started', 'atMost': 25 | 1 % for each 0.01 or part of it that"
                        + " the billing power factor is below 0.95, at most 25 %",
                "'slopes': [ { 'below': 0.95, 'perPoint': 1 } ], 'points': 'completed' | 1 % for each full 0.01 that the billing power"
                        + " factor is below 0.95",
                "'slopes': [ { 'below': 0.95, 'perPoint': 1 } ], 'points': 'majorFraction' | 1 % for each 0.01, or more than half of it,"
                        + " that the billing power factor is below 0.95",
                "'bands': [ { 'below': 0.75, 'value': 20 }, { 'upTo': 0.85, 'value': 10 }, { 'value': 0 } ] | 20 % where the billing power"
                        + " factor is below 0.75, 10 % at most 0.85, else 0 %",
                "'slopes': [ { 'below': 0.85, 'perPoint': 1 }, { 'above': 0.90, 'perPoint': -1 }, { 'above': 0.95, 'perPoint': -2 } ] | 1 %"
                        + " for each 0.01 (parts in proportion) that the billing power factor is below 0.85, and -1 % for each 0.01"
                        + " (parts in proportion) that the billing power factor is above 0.90 up to 0.95, then -2 % for each 0.01 (parts"
                        + " in proportion) that the billing power factor is above 0.95",
                "'ratioTo': 0.90, 'below': 60, 'above': 25, 'atLeast': -2.5, 'round': { 'to': 0.1 } | 60 × (0.90 ÷ the billing power factor"
                        + " − 1) % under 0.90, and 25 × (0.90 ÷ the billing power factor − 1) % over it, rounded half up to 0.1, at least"
                        + " -2.5 %",
                "'ratioTo': 1, 'onlyBelow': 0.96 | 100 × (1 ÷ the billing power factor − 1) % under 1 (only below 0.96)"
            })
    void aScheduleSaysWhatItTakesOfWhat(String schedule, String words) {
        assertThat(words(scheduled(schedule)).lines().get(1)).isEqualTo("PF: on Bill, " + words + ".");
    }

    @Test
    void theReactiveLineReadsAsASheetPrintsIt() {
        assertThat(words(plain(
                                "",
                                "{ 'name': 'Reactive energy', 'quantity': { 'energy': 'lagging kvarh' }, 'blocks': [ { 'upTo': { 'share':"
                                        + " 0.33, 'of': { 'energy': 'kWh' } }, 'price': 0 }, { 'price': 0.0420 } ] }"))
                        .lines())
                .containsExactly("Reactive energy: lagging kvarh above 33 % of the kWh, at 0.0420 per kvarh.");
    }

    @Test
    void aWholeRateReadsFromItsNameToItsTotal() {
        assertThat(words(
                                "{ 'name': 'Quay', 'currency': 'EUR', 'validFrom': '2026-01-01', 'powerFactors': { 'billing': { 'from':"
                                        + " 'energies', 'leading': 'added', 'round': { 'to': 0.01 } } }, 'seasons': { 'summer': { 'from': '06-01',"
                                        + " 'to': '09-30' }, 'winter': { 'from': '10-01', 'to': '05-31' } }, 'seasonBy': 'statementDate',"
                                        + " 'quantities': { 'billed': { 'raised': { 'peak': 'kW' }, 'by': { 'powerFactor': 'billing', 'ratioTo':"
                                        + " 0.95 } } }, 'lines': [ { 'name': 'Demand', 'quantity': 'billed', 'price': { 'bySeason': { 'summer': 13,"
                                        + " 'winter': 11 } } }, { 'name': 'Minimum', 'atLeast': { 'constant': 100, 'unit': 'money' }, 'of':"
                                        + " ['Demand'] }, { 'name': 'Tax', 'percentOf': 'all above', 'percent': 6 } ], 'roundLines': 'not',"
                                        + " 'roundTotal': { 'to': 0.05 } }")
                        .text())
                .isEqualTo("""
                        Quay, prices in EUR, from 2026-01-01
                        Power factor "billing": from the period's kWh and kvarh, leading kvarh added to lagging, rounded half up to 0.01.
                        Seasons: summer 1 June to 30 September, winter 1 October to 31 May; the date of the statement decides.
                        Quantity "billed": the highest kW raised by 100 × (0.95 ÷ the billing power factor − 1) % under 0.95.
                        Demand: billed, at 13 per kW in summer, 11 per kW in winter.
                        Minimum: brings Demand up to at least 100.
                        Tax: 6 % of all lines above.
                        Total: the lines added up, lines not rounded, the total rounded half up to 0.05.
                        """);
    }
}
