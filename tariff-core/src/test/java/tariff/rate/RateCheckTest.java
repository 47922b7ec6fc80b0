// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static tariff.rate.Sheets.ENERGY;
import static tariff.rate.Sheets.check;
import static tariff.rate.Sheets.findings;
import static tariff.rate.Sheets.plain;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.json.RateFile;
import tariff.notice.Refusal;

/** One rate for each kind of mistake, with what a clerk is told. */
class RateCheckTest {

    private static String line(String rest) {
        return "{ 'name': 'Line', " + rest + " }";
    }

    private static void assertOnly(String sheet, String... messages) {
        assertThat(findings(sheet)).containsExactly(messages);
        assertThat(check(sheet).rate()).isEmpty();
    }

    @Test
    void aBlockEdgeMustBeInTheUnitOfItsLine() {
        assertOnly(
                plain(
                        "",
                        ENERGY,
                        "{ 'name': 'b', 'quantity': { 'constant': 1 }, 'price': 1 }",
                        "{ 'name': 'c', 'quantity': { 'constant': 1 }, 'price': 1 }",
                        "{ 'name': 'd', 'quantity': { 'energy': 'lagging kvarh' }, 'blocks': [ { 'upTo': { 'share': 0.33, 'of': {"
                                + " 'energy': 'kWh' } }, 'price': 0 }, { 'upTo': { 'peak': 'kW' }, 'price': 1 }, { 'price': 2 } ] }"),
                "/lines/3/blocks/1/upTo: is in kW; this line bills kvarh, so the edge must be kvarh");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "{ 'sum': [ { 'energy': 'kWh' }, { 'energy': 'lagging kvarh' } ] } | /lines/0/quantity/sum/1: is in kvarh; it cannot be"
                        + " added to kWh",
                "{ 'largest': [ { 'peak': 'kW' }, { 'energy': 'kWh' } ] } | /lines/0/quantity/largest/1: is in kWh; it is compared with"
                        + " kW, so this must be kW",
                "{ 'smallest': [ { 'peak': 'kW' }, { 'constant': 5 } ] } | /lines/0/quantity/smallest/1: is in a plain number; it is"
                        + " compared with kW, so this must be kW",
                "{ 'excess': { 'peak': 'lagging kvar' }, 'over': { 'energy': 'kWh' } } | /lines/0/quantity/over: is in kWh; the excess is"
                        + " taken of kvar, so this must be kvar",
                "{ 'all': { 'energy': 'leading kvarh' }, 'onceAbove': { 'peak': 'kW' } } | /lines/0/quantity/onceAbove: is in kW; the"
                        + " limit is set for kvarh, so this must be kvarh",
                "{ 'hours': 200, 'of': { 'energy': 'kWh' } } | /lines/0/quantity/of: is in kWh; hours are counted of kW, kVA or kvar",
                "{ 'energy': 'kwh' } | /lines/0/quantity/energy: is not known; did you mean \"kWh\"?; found \"kwh\"; allowed: exported"
                        + " kWh, kVAh, kWh, lagging kvarh, leading kvarh",
                "{ 'peek': 'kW' } | /lines/0/quantity: says no kind of quantity; did you mean \"peak\"?; found peek; allowed: agreed,"
                        + " all, amount, constant, days, each, earlier, energy, excess, hours, largest, peak, priced, prorated, raised,"
                        + " rounded, share, smallest, sum",
                "{ 'peak': 'kW', 'energy': 'kWh' } | /lines/0/quantity: says several kinds of quantity at once; found peak, energy;"
                        + " allowed: agreed, all, amount, constant, days, each, earlier, energy, excess, hours, largest, peak,"
                        + " priced, prorated, raised, rounded, share, smallest, sum",
                "{ 'peak': 'kW', 'windw': 'day' } | /lines/0/quantity/windw: is not a key here; found windw; allowed: peak, in",
                "{ 'peak': 'kW', 'in': 'day' } | /lines/0/quantity/in: there is no window \"day\"; found day; allowed: none is defined",
                "'demand' | /lines/0/quantity: there is no quantity \"demand\"; found demand; allowed: none is defined",
                "{ 'rounded': { 'peak': 'kW' }, 'to': 0 } | /lines/0/quantity/to: must be above zero; found 0; allowed: a step such as 1"
                        + " or 0.01",
                "{ 'rounded': { 'peak': 'kW' }, 'to': 1, 'mode': 'halfup' } | /lines/0/quantity/mode: is not known; did you mean"
                        + " \"halfUp\"?; found \"halfup\"; allowed: halfUp, halfDown, halfEven, up, down",
                "{ 'share': 0.5 } | /lines/0/quantity: \"of\" is missing",
                "{ 'share': '0.5', 'of': { 'peak': 'kW' } } | /lines/0/quantity/share: must be a number; found \"0.5\"; allowed: a number"
                        + " such as 0.95, without quotes",
                "{ 'constant': 1e31 } | /lines/0/quantity/constant: is out of range; found 1E+31; allowed: up to 40 digits, below 1e30",
                "{ 'constant': 1e999999999 } | /lines/0/quantity/constant: is out of range; found 1E+999999999; allowed: up to 40 digits,"
                        + " below 1e30",
                "{ 'constant': 1e-999999999 } | /lines/0/quantity/constant: is out of range; found 1E-999999999; allowed: up to 40"
                        + " digits, below 1e30",
                "{ 'earlier': 'highest', 'of': { 'peak': 'kW' }, 'months': 61 } | /lines/0/quantity/months: must be a whole number; found"
                        + " 61; allowed: a whole number from 1 to 60",
                "{ 'earlier': 'highest', 'of': { 'peak': 'kW' }, 'months': 1.5 } | /lines/0/quantity/months: must be a whole number;"
                        + " found 1.5; allowed: a whole number from 1 to 60",
                "{ 'earlier': 'highest', 'of': { 'peak': 'kW' }, 'months': 11, 'onlyIn': [6.5] } | /lines/0/quantity/onlyIn/0: must be a"
                        + " whole number; found 6.5; allowed: a whole number from 1 to 12",
                "{ 'prorated': { 'peak': 'kW' }, 'perDays': 30, 'unlessDays': [25] } | /lines/0/quantity/unlessDays: must be two numbers;"
                        + " found a list; allowed: the fewest and the most days, such as [25, 35]",
                "{ 'amount': ['Enrgy'] } | /lines/0/quantity/amount/0: there is no line \"Enrgy\"; found Enrgy; allowed: none, for no"
                        + " line is above",
                "{ 'largest': [] } | /lines/0/quantity/largest: is empty; found a list; allowed: at least one entry",
                "7 | /lines/0/quantity: must be a quantity; found 7; allowed: the name of a quantity in quotes, or an object with one of:"
                        + " agreed, all, amount, constant, days, each, earlier, energy, excess, hours, largest, peak, priced, prorated,"
                        + " raised, rounded, share, smallest, sum"
            },
            quoteCharacter = '`')
    void aQuantityThatCannotBeIsNamed(String quantity, String message) {
        assertOnly(plain("", line("'quantity': " + quantity + ", 'price': 1")), message);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "'price': 'ten' | /lines/0/price: must be a number; found \"ten\"; allowed: a number such as 0.95, without quotes",
                "'rice': 1 | /lines/0: \"price\" is missing; /lines/0/rice: is not a key here; did you mean \"price\"?; found rice;"
                        + " allowed: name, clause, when, round, shownOnly, percentOf, atLeast, atMost, quantity, blocks, price",
                "'price': { 'byMonth': 1 } | /lines/0/price: is not a price; found an object; allowed: a number, or an object with one of:"
                        + " bySeason, byDate, bySchedule, blocks",
                "'blocks': [] | /lines/0/blocks: is empty; found a list; allowed: at least one entry",
                "'blocks': [ { 'upTo': 5, 'price': 1 } ] | /lines/0/blocks/0: is the last block, so it must be open: take \"upTo\" away or"
                        + " add a block",
                "'blocks': [ { 'price': 1 }, { 'price': 2 } ] | /lines/0/blocks/0: needs \"upTo\"; only the last block is open",
                "'blocks': [ { 'upTo': 5, 'price': 1 }, { 'upTo': 5, 'price': 2 }, { 'price': 3 } ] | /lines/0/blocks/1/upTo: must be above"
                        + " the block before it; found 5; allowed: more than 5",
                "'price': 1, 'blocks': [ { 'price': 1 } ] | /lines/0: says both \"price\" and \"blocks\"; found an object; allowed: one of"
                        + " the two",
                "'price': { 'bySeason': { 'summer': 1 } } | /lines/0/price/bySeason/summer: there is no season \"summer\"; found summer;"
                        + " allowed: none is defined",
                "'price': { 'byDate': [ { 'from': '2026-02-30', 'price': 1 } ] } | /lines/0/price/byDate/0/from: is not a day; found"
                        + " \"2026-02-30\"; allowed: a day such as 2026-04-13",
                "'price': { 'byDate': [ { 'from': '2026-02-01', 'price': 1 }, { 'from': '2026-02-01', 'price': 2 } ] } |"
                        + " /lines/0/price/byDate/1: must begin after the price before it; found 2026-02-01; allowed: a day after"
                        + " 2026-02-01",
                "'price': { 'bySchedule': { 'powerFactor': 'biling', 'ratioTo': 0.9 } } | /lines/0/price/bySchedule/powerFactor: there is"
                        + " no power factor \"biling\"; found biling; allowed: none is defined",
                "'price': 1, 'when': { 'option': '' } | /lines/0/when/option: must be a text; found \"\"; allowed: a text in quotes, not"
                        + " empty",
                "'price': 1, 'when': { 'above': 5 } | /lines/0/when: is not a condition; found an object; allowed: an object with one of:"
                        + " quantity, option, season, not",
                "'price': 1, 'when': { 'quantity': { 'peak': 'kW' }, 'reaches': { 'energy': 'kWh' } } | /lines/0/when/reaches: is in kWh;"
                        + " the quantity is in kW, so this must be kW",
                "'price': 1, 'when': { 'season': 'winter' } | /lines/0/when/season: there is no season \"winter\"; found winter; allowed:"
                        + " none is defined",
                "'price': 1, 'shownOnly': 'yes' | /lines/0/shownOnly: must be true or false; found \"yes\"; allowed: true, false"
            })
    void aPriceOrConditionThatCannotBeIsNamed(String rest, String messages) {
        String sheet = plain("", line("'quantity': { 'peak': 'kW' }, " + rest));
        assertThat(String.join("; ", findings(sheet))).isEqualTo(messages);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "'percentOf': ['Energi'], 'percent': 6 | /lines/1/percentOf/0: there is no line \"Energi\"; did you mean \"Energy\"?; found"
                        + " Energi; allowed: Energy",
                "'percentOf': ['Tax'], 'percent': 6 | /lines/1/percentOf/0: names the line \"Tax\", which is not above this one; found Tax;"
                        + " allowed: Energy",
                "'percentOf': ['Energy', 'Energy'], 'percent': 6 | /lines/1/percentOf/1: names the line \"Energy\" a second time",
                "'percentOf': 'all', 'percent': 6 | /lines/1/percentOf: is not a group of lines; found \"all\"; allowed: \"all above\", or"
                        + " a list of line names",
                "'percentOf': ['Energy'] | /lines/1: \"percent\" is missing",
                "'atLeast': { 'constant': 5 }, 'of': ['Energy'] | /lines/1/atLeast: is in a plain number; it bounds an amount of money, so"
                        + " this must be money",
                "'quantities': 1 | /lines/1: is not a line of a bill; found an object; allowed: \"quantity\" with \"price\" or \"blocks\";"
                        + " \"percentOf\" with \"percent\" or \"schedule\"; \"atLeast\" or \"atMost\" with \"of\"",
                "'quantity': { 'amount': ['Tax'] }, 'price': 1 | /lines/1/quantity/amount/0: names the line \"Tax\", which is not above"
                        + " this one; found Tax; allowed: Energy"
            })
    void aLineThatCannotBeIsNamed(String rest, String message) {
        assertOnly(plain("", ENERGY, line(rest), "{ 'name': 'Tax', 'percentOf': ['Energy'], 'percent': 6 }"), message);
    }

    @Test
    void allAboveNeedsALineAbove() {
        assertOnly(
                plain("", "{ 'name': 'Tax', 'percentOf': 'all above', 'percent': 6 }"),
                "/lines/0/percentOf: says \"all above\", but no line is above");
    }

    @Test
    void twoLinesOfOneNameAreTold() {
        assertOnly(plain("", ENERGY, ENERGY), "/lines/1/name: is the name of two lines: \"Energy\"");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "'a': 'a' | /quantities/a: \"a\" is defined through itself; only an earlier month's may be used",
                "'a': { 'share': 1, 'of': 'b' }, 'b': 'a' | /quantities/a: \"a\" is defined through itself; only an earlier month's may be"
                        + " used && /quantities/b: \"b\" is defined through itself; only an earlier month's may be used",
                "'a': { 'amount': ['Demand'] } | /quantities/a: \"a\" is defined through itself; only an earlier month's may be used",
                "'a': { 'amount': ['Tax'] } | /quantities/a: \"a\" is defined through itself; only an earlier month's may be used"
            })
    void aQuantityThatLeansOnItselfIsTold(String quantities, String messages) {
        String sheet = plain(
                "'quantities': {" + quantities + "},",
                "{ 'name': 'Demand', 'quantity': 'a', 'price': 1 }",
                "{ 'name': 'Tax', 'percentOf': ['Demand'], 'percent': 6 }");
        assertThat(String.join(" && ", findings(sheet))).isEqualTo(messages);
    }

    /** A ratchet on billed demand leans on its own past, which is no circle. */
    @Test
    void aQuantityMayLeanOnItsPast() {
        assertThat(findings(plain(
                        "'quantities': { 'a': { 'largest': [ { 'peak': 'kW' }, { 'share': 0.8, 'of': { 'earlier': 'highest', 'of': 'a',"
                                + " 'months': 11 } } ] } },",
                        "{ 'name': 'Demand', 'quantity': 'a', 'price': 1 }")))
                .isEmpty();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "06-01 | 09-30 | 10-01 | 05-30 | /seasons: leave a gap: 05-31 lies in none",
                "06-01 | 09-30 | 09-30 | 05-31 | /seasons: overlap: 09-30 lies in summer and winter",
                "06-01 | 02-28 | 03-01 | 05-31 | /seasons: leave a gap: 02-29 lies in none",
                "06-31 | 12-31 | 01-01 | 05-31 | /seasons/summer/from: is not a day of the year; found \"06-31\"; allowed: month and day,"
                        + " such as 06-01"
            })
    void seasonsFillTheYearWithoutOverlap(String from, String to, String winterFrom, String winterTo, String message) {
        String sheet = plain(
                "'seasons': { 'summer': { 'from': '" + from + "', 'to': '" + to + "' }, 'winter': { 'from': '"
                        + winterFrom + "', 'to': '" + winterTo + "' } },",
                "{ 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'price': { 'bySeason': { 'summer': 2, 'winter': 1 } } }");
        assertThat(findings(sheet)).contains(message);
    }

    @Test
    void everySeasonNeedsAPrice() {
        assertOnly(
                plain(
                        "'seasons': { 'summer': { 'from': '06-01', 'to': '09-30' }, 'winter': { 'from': '10-01', 'to': '05-31' } },",
                        "{ 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'price': { 'bySeason': { 'summer': 2 } } }"),
                "/lines/0/price/bySeason: gives no price for the season \"winter\"");
    }

    @Test
    void leadingBelongsToAPowerFactorFromEnergies() {
        assertThat(findings(
                        "{ 'name': 'Sheet', 'currency': 'EUR', 'powerFactors': { 'a': { 'from': 'peak', 'leading': 'added' }, 'b': {"
                                + " 'from': 'energie' } }, 'lines': [" + ENERGY + "] }"))
                .contains(
                        "/powerFactors/b/from: is not known; did you mean \"energies\"?; found \"energie\"; allowed: energies, kVAh, peak,"
                                + " printed",
                        "/powerFactors/a/leading: says what leading kvarh do, but the power factor does not come from energies");
    }

    @Test
    void everythingThatIsWrongIsToldAtOnce() {
        assertOnly(
                "{ 'name': '', 'currency': 'Euro', 'validFrom': '1 May', 'seasonBy': 'luck', 'line': [], 'lines': [ { 'quantity': 'kw',"
                        + " 'price': 1 }, { 'name': 'b', 'quantity': { 'energy': 'kWh' }, 'price': null } ] }",
                "/name: must be a text; found \"\"; allowed: a text in quotes, not empty",
                "/currency: is not a currency code; found \"Euro\"; allowed: three capital letters, such as EUR (ISO 4217)",
                "/validFrom: is not a day; found \"1 May\"; allowed: a day such as 2026-01-01",
                "/seasonBy: is not known; found \"luck\"; allowed: days, firstDay, lastDay, statementDate",
                "/lines/0: \"name\" is missing",
                "/lines/1/price: must be a number; found null; allowed: a number such as 0.95, without quotes",
                "/line: is not a key here; did you mean \"lines\"?; found line; allowed: name, currency, validFrom, source, follows,"
                        + " powerFactors, timeZone, holidays, windows, seasons, seasonBy, quantities, lines, roundLines, roundTotal",
                "/lines/0/quantity: there is no quantity \"kw\"; found kw; allowed: none is defined");
    }

    @Test
    void whatIsNoRateAtAllIsTold() {
        assertThat(findings("[]"))
                .containsExactly(
                        ": must be a rate; found a list; allowed: an object with \"name\", \"currency\" and \"lines\""
                                .substring(2));
        assertThatThrownBy(() -> RateFile.parse("{ \"name\": \"a\", \"name\": \"b\" }"))
                .isInstanceOf(Refusal.class)
                .hasMessageContaining("is not valid JSON: Duplicate field 'name'");
        assertThatThrownBy(() -> RateFile.parse("{ \"price\": 1." + "0".repeat(200) + " }"))
                .isInstanceOf(Refusal.class)
                .hasMessage(
                        "is larger than a document can be; allowed: 60 levels, 50000 parts, numbers of 100 characters");
    }

    @Test
    void aWrongRateIsRefusedWithAllItsFindings() {
        assertThatThrownBy(() -> RateFile.parse("{ \"name\": \"a\" }"))
                .isInstanceOf(Refusal.class)
                .hasMessage("\"currency\" is missing\n\"lines\" is missing");
    }
}
