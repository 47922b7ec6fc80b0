// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.tuple;
import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.LAGGING_KVARH;
import static tariff.meter.Register.PEAK_KVA;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.UnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import tariff.meter.Charged;
import tariff.meter.MeteredMonth;
import tariff.meter.Period;
import tariff.meter.Register;

class CauseTest {
    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            power-factor-rounding | 'to': 0.01, 'mode': 'halfUp' } }  | 'to': 0.001, 'mode': 'halfUp' } }
            power-factor-rounding | 'to': 0.01, 'mode': 'halfUp' } }  | 'to': 0.01, 'mode': 'down' } }
            power-factor-rounding | , 'round': { 'to': 0.01, 'mode': 'halfUp' } | ``
            power-factor-basis    | 'from': 'energies', 'leading': 'ignored' | 'from': 'kVAh'
            power-factor-basis    | 'from': 'energies', 'leading': 'ignored' | 'from': 'peak'
            power-factor-basis    | 'from': 'energies', 'leading': 'ignored' | 'from': 'printed'
            leading-kvarh         | 'ignored' | 'added'
            leading-kvarh         | 'ignored' | 'netted'
            point-count           | 'started' | 'exact'
            point-count           | 'started' | 'completed'
            point-count           | 'started' | 'majorFraction'
            demand-rounding       | 'to': 1, 'mode': 'halfUp' | 'to': 1, 'mode': 'up'
            demand-rounding       | 'to': 1, 'mode': 'halfUp' | 'to': 0.1, 'mode': 'halfUp'
            demand-rounding       | { 'peak': 'kW' } | { 'rounded': { 'peak': 'kW' }, 'to': 1, 'mode': 'down' }
            demand-register       | 'peak': 'kW' | 'peak': 'kVA'
            amount-rounding       | 'lines': [ | 'roundLines': { 'to': 1 }, 'lines': [
            amount-rounding       | 'lines': [ | 'roundTotal': { 'to': 0.05 }, 'lines': [
            season-choice         | 'seasons': | 'seasonBy': 'firstDay', 'seasons':
            season-choice         | 'seasons': | 'seasonBy': 'lastDay', 'seasons':
            line-left-out         | , { 'name': 'Tax', 'percentOf': 'all above', 'percent': 6 } | ``
            percentage-not-in-rate| 'percent': 6 } | 'percent': 6 }, { 'name': 'Levy', 'percentOf': 'all above', 'percent': 1.25 }
            amount-not-in-rate    | 'percent': 6 } | 'percent': 6 }, { 'name': 'Meter', 'quantity': { 'constant': 1 }, 'price': 14.2 }
            """)
    void aBillMadeOtherwiseIsFound(String code, String printed, String done) {
        String rate = PaidBills.RATE.replaceAll("\\s+", " ");
        assertThat(rate).contains(printed);
        String otherwise = rate.replace(printed, done == null ? "" : done);
        Reconciliation found = reconcile(rate, PaidBills.charged(otherwise, PaidBills.year(1)));
        assertThat(found.explanations().get(0).code()).isEqualTo(code);
        assertThat(found.explanations().get(0).then()).isEqualTo(new Tally(12, 12, 12));
        assertThat(found.unexplained()).isEmpty();
    }

    static Reconciliation reconcile(String rate, List<MeteredMonth> months) {
        return Reconciliation.of(PaidBills.billing(rate), months);
    }

    /** A year in which nothing but one month was read otherwise than it was billed. */
    private static Reconciliation misread(int place, UnaryOperator<MeteredMonth> misread) {
        List<MeteredMonth> real = PaidBills.year(2);
        List<MeteredMonth> given = PaidBills.with(real, place, misread.apply(real.get(place)));
        return reconcile(PaidBills.RATE, PaidBills.charged(PaidBills.RATE, given, real));
    }

    private static String best(Reconciliation found) {
        return found.explanations().get(0).code() + ": "
                + found.explanations().get(0).message();
    }

    @ParameterizedTest
    @EnumSource(names = {"ENERGY_KWH", "LAGGING_KVARH", "PEAK_KW"})
    void swappedDigitsOfAReadingAreFound(Register register) {
        for (int digit = 0; digit < 2; digit++) {
            BigDecimal real = PaidBills.year(2).get(3).totals().get(register).orElseThrow();
            BigDecimal slip = Digits.swapped(real).get(digit);
            Reconciliation found = misread(3, month -> month.with(month.totals().with(register, slip)));
            assertThat(best(found))
                    .isEqualTo("digits-swapped: 2025-04 would agree to the cent with " + register.words() + " "
                            + Digits.shown(real) + " for " + Digits.shown(slip) + " (digits swapped)");
        }
    }

    @Test
    void swappedDigitsOfTheTotalAreFound() {
        List<MeteredMonth> year = PaidBills.charged(PaidBills.RATCHET, year(400, 410, 420));
        assertThat(year.get(1).charged().total()).hasValue(new BigDecimal("15385.66"));
        MeteredMonth month = year.get(1).withCharged(Charged.total("13585.66"));
        assertThat(best(reconcile(PaidBills.RATCHET, PaidBills.with(year, 1, month))))
                .isEqualTo(
                        "total-digits-swapped: 2025-02 would agree to the cent with a total of 15,385.66 for 13,585.66"
                                + " (digits swapped)");
    }

    @Test
    void swappedRegistersAreFound() {
        assertThat(best(misread(
                        5,
                        month -> month.with(
                                        ENERGY_KWH,
                                        month.totals()
                                                .get(LAGGING_KVARH)
                                                .orElseThrow()
                                                .toString())
                                .with(
                                        LAGGING_KVARH,
                                        month.totals()
                                                .get(ENERGY_KWH)
                                                .orElseThrow()
                                                .toString()))))
                .isEqualTo(
                        "registers-swapped: 2025-06 would agree to the cent with kWh and kvarh in each other's place");
    }

    @Test
    void theReadingsOfTheMonthBeforeAreFound() {
        List<MeteredMonth> given = PaidBills.year(2);
        List<MeteredMonth> billed =
                PaidBills.with(given, 8, given.get(8).with(given.get(7).totals()));
        assertThat(best(reconcile(PaidBills.RATE, PaidBills.charged(PaidBills.RATE, given, billed))))
                .isEqualTo(
                        "readings-of-the-month-before: 2025-09 would agree to the cent with the readings of 2025-08");
    }

    /** 9,000 kWh too few in the estimated month, made up for in the next. */
    @Test
    void anEstimatedReadingIsFoundWhereTwoMonthsOnlyAgreeTogether() {
        List<MeteredMonth> given = PaidBills.year(2);
        List<MeteredMonth> billed = PaidBills.with(
                PaidBills.with(given, 1, moreKwh(given.get(1), -9_000)), 2, moreKwh(given.get(2), 9_000));
        Reconciliation found = reconcile(PaidBills.RATE, PaidBills.charged(PaidBills.RATE, given, billed));
        assertThat(best(found))
                .isEqualTo(
                        "estimated-reading: 2025-02 would agree to the cent with 9,000 kWh moved from 2025-02 to 2025-03 (an estimated"
                                + " reading); 2025-03 would agree to the cent with 9,000 kWh moved from 2025-02 to 2025-03 (an"
                                + " estimated reading)");
    }

    private static MeteredMonth moreKwh(MeteredMonth month, long kwh) {
        BigDecimal all = month.totals().get(ENERGY_KWH).orElseThrow();
        return month.with(month.totals().with(ENERGY_KWH, all.add(BigDecimal.valueOf(kwh))));
    }

    @Test
    void winterPricesInTwoSummerMonthsAreFoundInThoseMonthsAlone() {
        String winter = PaidBills.RATE.replace("'summer': 13.10", "'summer': 11.40");
        List<MeteredMonth> right = PaidBills.charged(PaidBills.RATE, PaidBills.year(2));
        List<MeteredMonth> wrong = PaidBills.charged(winter, PaidBills.year(2));
        List<MeteredMonth> year = PaidBills.with(PaidBills.with(right, 5, wrong.get(5)), 6, wrong.get(6));
        assertThat(best(reconcile(PaidBills.RATE, year)))
                .isEqualTo(
                        "season-prices: 2025-06 would agree to the cent with the prices of \"winter\"; 2025-07 would agree to the"
                                + " cent with the prices of \"winter\"");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            30 | 30 days in every period
            +1 | one day more in every period (the day of the reading counted in both)
            -1 | one day less in every period
            """)
    void daysCountedOtherwiseAreFound(String how, String words) {
        String rate = PaidBills.RATE.replace("'price': 2.35", "'price': 312.40");
        List<MeteredMonth> given = PaidBills.year(2);
        List<MeteredMonth> billed = given.stream()
                .map(month -> new MeteredMonth(
                        switch (how) {
                            case "30" ->
                                new Period(
                                        month.period().first(),
                                        month.period().first().plusDays(29));
                            case "+1" ->
                                new Period(
                                        month.period().first().minusDays(1),
                                        month.period().last());
                            default ->
                                new Period(
                                        month.period().first().plusDays(1),
                                        month.period().last());
                        },
                        month.totals()))
                .toList();
        Explanation best = reconcile(rate, PaidBills.charged(rate, given, billed))
                .explanations()
                .get(0);
        assertThat(best.code()).isEqualTo("days-billed");
        assertThat(best.words()).isEqualTo(words);
        assertThat(best.then()).isEqualTo(new Tally(12, 12, 12));
    }

    @Test
    void aRatchetThatWasNotAppliedIsFound() {
        String without = PaidBills.RATCHET.replace("'share': 0.8", "'share': 0.0");
        List<MeteredMonth> year = year(180, 520, 300, 310, 320, 330, 340, 350, 360, 370, 380, 390);
        assertThat(best(reconcile(PaidBills.RATCHET, PaidBills.charged(without, year))))
                .isEqualTo(
                        "ratchet-left-out: the ratchet left out would make 12 of 12 months agree to the cent; as the rate stands 2 of"
                                + " 12 months agree to the cent");
    }

    /** 80 % of 600 kVA are 480 kVA, above what most months ask for; after four months the old peak is forgotten. */
    @Test
    void aPeakFromBeforeTheFirstBillIsFound() {
        List<MeteredMonth> year = year(380, 390, 400, 410, 420, 430, 400, 390, 380, 400, 410, 390);
        List<MeteredMonth> past = new ArrayList<>();
        for (int month = 5; month <= 12; month++) {
            past.add(MeteredMonth.of(String.format("2024-%02d", month))
                    .with(ENERGY_KWH, 100_000)
                    .with(PEAK_KVA, month == 5 ? 600 : 400));
        }
        List<MeteredMonth> all = new ArrayList<>(past);
        all.addAll(year);
        List<MeteredMonth> charged = PaidBills.charged(PaidBills.RATCHET, all).subList(8, 20);
        assertThat(best(reconcile(PaidBills.RATCHET, charged)))
                .isEqualTo(
                        "peak-before-the-bills: a highest kVA of 600 in 2024-05, before the first bill, would make 12 of 12 months"
                                + " agree to the cent; as the rate stands 8 of 12 months agree to the cent");
    }

    private static List<MeteredMonth> year(long... kva) {
        List<MeteredMonth> months = new ArrayList<>();
        for (int i = 0; i < kva.length; i++) {
            months.add(MeteredMonth.of(String.format("2025-%02d", i + 1))
                    .with(ENERGY_KWH, 100_000 + 317L * i)
                    .with(PEAK_KVA, kva[i]));
        }
        return months;
    }

    @Test
    void linesThatTheRateDoesNotHaveAreNamed() {
        MeteredMonth month = PaidBills.charged(PaidBills.RATCHET, year(400)).get(0);
        BigDecimal total = month.charged().total().orElseThrow();
        MeteredMonth printed = month.withCharged(new Charged(
                Optional.of(total.add(new BigDecimal("18.50"))),
                Map.of("Energy", new BigDecimal("11250.00"), "Meter rent", new BigDecimal("18.50"))));
        Reconciliation found = reconcile(PaidBills.RATCHET, List.of(printed));
        assertThat(best(found))
                .isEqualTo(
                        "lines-not-in-rate: 2025-01 would agree to the cent with \"Meter rent\" 18.50 left out, which the rate does"
                                + " not have");
        assertThat(found.agreement().months().get(0).lines())
                .extracting(
                        ReconciledLine::name,
                        ReconciledLine::verdict,
                        line -> line.difference().toPlainString())
                .containsExactly(
                        tuple("Energy", Verdict.AGREES, "0.00"),
                        tuple("Demand", Verdict.NOT_ON_BILL, "-4000.00"),
                        tuple("Meter rent", Verdict.NOT_IN_RATE, "18.50"));
    }

    @Test
    void twoCausesAtOnceAreFoundWhereNoneAloneExplains() {
        String otherwise = PaidBills.RATE.replace("'started'", "'exact'").replace("'percent': 6", "'percent': 0");
        Reconciliation found = reconcile(PaidBills.RATE, PaidBills.charged(otherwise, PaidBills.year(2)));
        assertThat(best(found))
                .isEqualTo(
                        "line-left-out+point-count: the line \"Tax\" left out and broken points of power factor counted in"
                                + " proportion would make 12 of 12 months agree to the cent; as the rate stands 0 of 12 months agree");
    }

    @Test
    void whereEverythingAgreesNothingIsExplained() {
        Reconciliation found = reconcile(PaidBills.RATE, PaidBills.charged(PaidBills.RATE, PaidBills.year(1)));
        assertThat(found.agreement().toTheCent()).isEqualTo(12);
        assertThat(found.explanations()).isEmpty();
        assertThat(found.unexplained()).isEmpty();
        assertThat(found.assumption()).isEmpty();
    }

    @Test
    void monthsThatNothingExplainsAreNamed() {
        List<MeteredMonth> year = PaidBills.charged(PaidBills.RATE, PaidBills.year(1));
        Reconciliation found =
                reconcile(PaidBills.RATE, PaidBills.with(year, 2, year.get(2).withCharged(Charged.total("20123.45"))));
        assertThat(found.explanations()).isEmpty();
        assertThat(found.unexplained())
                .extracting(month -> month.period() + " " + month.verdict().words())
                .containsExactly("2025-03 does not agree");
        assertThat(found.assumption().orElseThrow().message())
                .isEqualTo(
                        "1 of 12 bills does not agree with this rate; the difference is 9,009.22 in all, 2.7 % of what was charged");
    }
}
