// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.math.BigDecimal;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import tariff.meter.MeteredMonth;
import tariff.meter.Register;
import tariff.notice.Refusal;

/** Files as people keep them. All sites and figures are invented. */
class BillsFileTest {

    @Test
    void plainEnglishFile() {
        BillsRead read = read("""
                Month,Energy (kWh),Reactive kvarh,Peak kW,Power factor,Remarks
                Jan 2026,120000,80000,410.5,0.83,cold
                Feb 2026,110000,70000,400,0.84,
                """);
        assertThat(read.months())
                .containsExactly(
                        MeteredMonth.of("2026-01")
                                .with(Register.ENERGY_KWH, 120000)
                                .with(Register.LAGGING_KVARH, 80000)
                                .with(Register.PEAK_KW, "410.5")
                                .with(Register.POWER_FACTOR, "0.83"),
                        MeteredMonth.of("2026-02")
                                .with(Register.ENERGY_KWH, 110000)
                                .with(Register.LAGGING_KVARH, 70000)
                                .with(Register.PEAK_KW, 400)
                                .with(Register.POWER_FACTOR, "0.84"));
        assertThat(read.understood())
                .containsExactly(
                        "Encoding: UTF-8",
                        "Separator: comma",
                        "Decimal mark: point, shown by 410.5 in row 2, column D (Peak kW)",
                        "Names: in row 1, one month a row",
                        "Column A (Month): the month billed",
                        "Column B (Energy (kWh)): kWh",
                        "Column C (Reactive kvarh): lagging kvarh",
                        "Column D (Peak kW): kW",
                        "Column E (Power factor): power factor",
                        "Column F (Remarks): ignored, not known");
        assertThat(read.warnings()).isEmpty();
    }

    @Test
    void germanFileWithTitleUnitsRowAndTotals() {
        BillsRead read = read("""
                Stromrechnungen Werk Nord;;;;
                ;;;;
                Abrechnungsmonat;Wirkarbeit;Blindarbeit induktiv;Höchstleistung;Rechnungsbetrag
                ;MWh;kvarh;kW;EUR
                März 2026;1.234,5;800.000;2.100,5;"123.456,78 €"
                Februar 2026;1.100,0;700.000;2.000;98.000,00 €
                Summe;2.334,5;1.500.000;;221.456,78 €
                """);
        assertThat(read.months()).extracting(month -> month.period().toString()).containsExactly("2026-02", "2026-03");
        MeteredMonth march = read.months().get(1);
        assertThat(march.totals().get(Register.ENERGY_KWH).orElseThrow()).isEqualByComparingTo("1234500");
        assertThat(march.totals().get(Register.LAGGING_KVARH)).contains(new BigDecimal("800000"));
        assertThat(march.totals().get(Register.PEAK_KW)).contains(new BigDecimal("2100.5"));
        assertThat(march.charged().total()).contains(new BigDecimal("123456.78"));
        assertThat(read.understood())
                .contains(
                        "Separator: semicolon",
                        "Decimal mark: comma, shown by 1.234,5 in row 5, column B (Wirkarbeit (MWh))",
                        "Names: in row 3, units below them, one month a row",
                        "Column B (Wirkarbeit (MWh)): kWh, × 1000",
                        "Row 1: left out, it stands above the names",
                        "Row 7: left out, it is a total or an average (Summe)");
    }

    @Test
    void monthsAcross() {
        BillsRead read = read("""
                Site A\tJan-26\tFeb-26\tMar-26\tTotal
                kWh\t1'000.5\t2'000.5\t3'000.5\t6'001.5
                Lagging kvarh\t500\t600\tn/a\t1'100
                """);
        assertThat(read.months()).hasSize(3);
        assertThat(read.months().get(2).totals().get(Register.ENERGY_KWH)).contains(new BigDecimal("3000.5"));
        assertThat(read.months().get(2).totals().has(Register.LAGGING_KVARH)).isFalse();
        assertThat(read.understood())
                .contains(
                        "Separator: tab",
                        "Names: in column A, one month a column",
                        "Row 1 (Site A): the month billed",
                        "Row 2 (kWh): kWh",
                        "Column E: left out, it is a total or an average (Total)");
    }

    @Test
    void newestMonthFirstComesBackOldestFirst() {
        assertThat(read("Month|kWh\n2026-03|3\n2026-02|2\n2026-01|1\n").months())
                .extracting(month -> month.period().toString())
                .containsExactly("2026-01", "2026-02", "2026-03");
    }

    @Test
    void readingDaysGivenAsEndOfOnePeriodAndStartOfTheNext() {
        BillsRead read = read("From,To,kWh\n2026-01-05,2026-02-04,1\n2026-02-04,2026-03-05,2\n");
        assertThat(read.months())
                .extracting(month -> month.period().toString())
                .containsExactly("2026-01-05 to 2026-02-03", "2026-02-04 to 2026-03-04");
        assertThat(read.understood())
                .contains(
                        "Periods: each ends on the day the next begins, so the end is a day of meter reading and the last day billed is"
                                + " the day before");
    }

    @Test
    void periodsInOneCell() {
        assertThat(read("Billing period;kWh\n01.01.2026 - 31.01.2026;5\n01.02.2026 – 28.02.2026;6\n")
                        .months())
                .extracting(month -> month.period().toString())
                .containsExactly("2026-01", "2026-02");
    }

    @Test
    void yearAndMonthInColumnsOfTheirOwn() {
        assertThat(read("Year,Month,kWh\n2025,12,5\n2026,1,6\n2026,Feb,7\nTotal,,18\n")
                        .months())
                .extracting(month -> month.period().toString())
                .containsExactly("2025-12", "2026-01", "2026-02");
    }

    @Test
    void windowsAndLinesOfTheRate() {
        BillsRead read = BillsFile.read(
                bytes("Month,kWh day,night kWh,kvarh (night),Energy charge (EUR),Total charged,kWh\n"
                        + "2026-01,70,30,12,\"1,234.50\",1300.75,100\n"),
                ReadingChoices.none().windows("day", "night").lines("Energy charge"));
        MeteredMonth month = read.months().get(0);
        assertThat(month.get(Register.ENERGY_KWH, Optional.of("day"))).contains(new BigDecimal("70"));
        assertThat(month.get(Register.ENERGY_KWH, Optional.of("night"))).contains(new BigDecimal("30"));
        assertThat(month.get(Register.LAGGING_KVARH, Optional.of("night"))).contains(new BigDecimal("12"));
        assertThat(month.get(Register.ENERGY_KWH, Optional.empty())).contains(new BigDecimal("100"));
        assertThat(month.charged().lines()).containsEntry("Energy charge", new BigDecimal("1234.50"));
        assertThat(month.charged().total()).contains(new BigDecimal("1300.75"));
    }

    @Test
    void aWindowThatTheRateDoesNotNameIsNotReadAsTheWholeMonth() {
        BillsRead read = read("Month,kWh,kWh night\n2026-01,100,30\n");
        assertThat(read.months()).containsExactly(MeteredMonth.of("2026-01").with(Register.ENERGY_KWH, 100));
        assertThat(read.warnings())
                .extracting(Object::toString)
                .containsExactly(
                        "column C (kWh night): is not used: it names a part of the day that is no window of the rate");
    }

    @Test
    void peakKwBesideAWindowCalledPeakIsAsked() {
        assertThatThrownBy(() -> BillsFile.read(
                        bytes("Month,kWh,Peak kW\n2026-01,100,30\n"),
                        ReadingChoices.none().windows("peak", "off-peak")))
                .isInstanceOf(Refusal.class)
                .hasMessage("column C (Peak kW): may be the month's highest kW or the one in the window \"peak\"; "
                        + "write \"Max kW\" or \"Max kW peak\"");
    }

    @Test
    void energyInTwoUnitsIsReadFromTheFiner() {
        BillsRead read = read("Month,MWh,kWh\n2026-01,0.1,100\n");
        assertThat(read.months()).containsExactly(MeteredMonth.of("2026-01").with(Register.ENERGY_KWH, 100));
        assertThat(read.warnings())
                .extracting(Object::toString)
                .containsExactly(
                        "column B (MWh): is not used: column C (kWh) gives the same; the two were not compared");
    }

    @Test
    void powerFactorsInPerCent() {
        BillsRead read = read("Month,kWh,PF\n2026-01,1,87 %\n2026-02,1,87\n2026-03,1,0.87\n2026-04,1,1.000\n");
        assertThat(read.months())
                .extracting(month -> month.totals().get(Register.POWER_FACTOR).orElseThrow())
                .containsExactly(
                        new BigDecimal("0.87"),
                        new BigDecimal("0.87"),
                        new BigDecimal("0.87"),
                        new BigDecimal("1.000"));
    }

    @Test
    void blankRowsCommentsNotesAndEmptyMonthsAreLeftOut() {
        BillsRead read = read("""
                # kept by the workshop
                Month,kWh

                2026-01,5
                # meter changed
                2026-02,
                2026,5
                Checked by the boiler house,
                """);
        assertThat(read.months()).hasSize(1);
        assertThat(read.understood())
                .containsSequence(
                        "Row 1: left out, it stands above the names",
                        "Row 5: left out, it is a comment",
                        "Row 6: left out, it has no figures",
                        "Row 7: left out, it is a total or an average (2026)",
                        "Row 8: left out, it has no figures");
    }

    @Test
    void estimatesAndStatementDates() {
        MeteredMonth month = read("Month,kWh,Estimated,Statement date\n2026-01,5,yes,2026-02-03\n")
                .months()
                .get(0);
        assertThat(month.estimated()).isTrue();
        assertThat(month.statementDate()).contains(java.time.LocalDate.of(2026, 2, 3));
    }

    @Test
    void namesWithLineBreaksAndTheCornerLeftEmpty() {
        BillsRead read = read(",\"Energy\n(kWh)\",\"Max demand\nkVA\"\nJan 2026,5,6\nFeb 2026,5,6\n");
        assertThat(read.months().get(0))
                .isEqualTo(
                        MeteredMonth.of("2026-01").with(Register.ENERGY_KWH, 5).with(Register.PEAK_KVA, 6));
    }

    @Test
    void everyEncodingGivesTheSameMonths() {
        String text = "Mois;Énergie active (kWh);Énergie réactive (kvarh)\njanvier 2026;1 234,5;12\nfévrier 2026;7;8\n";
        List<MeteredMonth> expected = BillsFile.read(text.getBytes(StandardCharsets.UTF_8), ReadingChoices.none())
                .months();
        assertThat(expected).hasSize(2);
        for (byte[] bytes : List.of(
                ("\ufeff" + text).getBytes(StandardCharsets.UTF_8),
                ("\ufeff" + text).getBytes(StandardCharsets.UTF_16LE),
                ("\ufeff" + text).getBytes(StandardCharsets.UTF_16BE),
                text.getBytes(Charset.forName("windows-1252")))) {
            assertThat(BillsFile.read(bytes, ReadingChoices.none()).months()).isEqualTo(expected);
        }
    }

    @Test
    void aLineThatNamesTheSeparatorIsNoRow() {
        assertThat(read("sep=;\nMonth;kWh\n2026-01;1,5\n").understood()).contains("Names: in row 1, one month a row");
    }

    static BillsRead read(String text) {
        return BillsFile.read(bytes(text), ReadingChoices.none());
    }

    static byte[] bytes(String text) {
        return text.getBytes(StandardCharsets.UTF_8);
    }
}
