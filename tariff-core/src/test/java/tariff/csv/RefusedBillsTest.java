// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.notice.Refusal;

/** What is said when a file cannot be used, word for word. */
class RefusedBillsTest {

    @Test
    void everythingWrongIsSaidAtOnce() {
        refused("""
                Month,kWh,Peak kW,PF,Estimated
                2026-01,abc,410.5,0.95C,yes
                soon,5,#DIV/0!,1.2,perhaps
                46023,5,-3,-0.95,no
                ,5,5,0.9,
                2026-04,5,5 kVA,,maybe
                """, """
                row 3, column A (Month): is not a date; found soon; allowed: a month such as 2026-01 or Jan 2026, or a day such as 2026-01-31
                row 4, column A (Month): looks like a spreadsheet's number for a day; give the column a date format and export again; found 46023; allowed: a month such as 2026-01 or Jan 2026, or a day such as 2026-01-31
                row 5: has figures but no month; allowed: a month in each row; a word such as Total before a row of totals
                row 6: does not follow the period before it; days between are not billed; found nothing for 2026-02-01 to 2026-03-31
                row 2, column B (kWh): is not a number; found abc; allowed: a number such as 1234.5; nothing or n/a where there is no figure
                row 2, column D (PF): carries a mark of its side, and such marks mean different things on different bills; give lagging and leading kvarh, or write the power factor without the mark if the current lags; found 0.95C; allowed: a number above 0 and at most 1, or per cent
                row 6, column C (Peak kW): is in another unit than its column; found 5 kVA; allowed: a figure in kW
                row 6, column E (Estimated): does not say whether a reading was estimated; found maybe; allowed: yes or no""");
    }

    @Test
    void figuresOutOfRange() {
        refused("Month,kWh,Peak kW,PF\n2026-01,-5,####,1.2\n2026-02,5,5,-0.95\n", """
                row 2, column B (kWh): is below zero; a minus may mean leading or sent back, which have columns of their own; found -5; allowed: 0 or more
                row 2, column C (Peak kW): is a spreadsheet's mark for a formula that failed or a column too narrow; found ####; allowed: a number such as 1234.5; nothing or n/a where there is no figure
                row 2, column D (PF): is not a power factor; found 1.2; allowed: a number above 0 and at most 1, or per cent from 10 to 100
                row 3, column D (PF): carries a mark of its side, and such marks mean different things on different bills; give lagging and leading kvarh, or write the power factor without the mark if the current lags; found -0.95; allowed: a number above 0 and at most 1, or per cent""");
    }

    @ParameterizedTest
    @CsvSource({"0.95C", "0.95 lead", "0.95 lag", "-0.95", "0.95 cap", "C0.95", "95% ind", "0.95L"})
    void aPowerFactorWithAMarkOfItsSideIsAsked(String cell) {
        assertThatThrownBy(() -> BillsFileTest.read("Month,kWh,PF\n2026-01,5," + cell + "\n"))
                .hasMessageStartingWith("row 2, column C (PF): carries a mark of its side");
    }

    @Test
    void aMonthTwice() {
        refused("Month,kWh\n2026-01,5\nJan 2026,6\n", "row 3: bills the same days as row 2; found 2026-01");
    }

    @Test
    void periodsOverOneAnother() {
        refused(
                "From,To,kWh\n2026-01-01,2026-02-03,5\n2026-02-01,2026-02-28,6\n",
                "row 3: bills days that row 2 bills too; found 2026-02 and 2026-01-01 to 2026-02-03");
    }

    @Test
    void aPeriodThatEndsBeforeItBegins() {
        refused(
                "From,To,kWh\n2026-02-01,2026-01-01,5\n",
                "row 2: ends before it begins; found 2026-02-01 – 2026-01-01");
    }

    @Test
    void aDayThatIsNoMonth() {
        refused(
                "Date,kWh\n2026-02-17,5\n",
                "row 2: gives one day, which does not say which days were billed; found 2026-02-17; allowed: a month, the first or"
                        + " last day of a month, or From and To");
    }

    @Test
    void inATurnedTableThePlaceIsTheFilesOwn() {
        refused(
                ",Jan 2026,Feb 2026\nkWh,5,abc\nPeak kW,1,2\n",
                "row 2 (kWh), column C: is not a number; found abc; allowed: a number such as 1234.5; nothing or n/a where there is"
                        + " no figure");
    }

    @Test
    void aMissingMonthAndAPartOfAMonthAreWarnings() {
        BillsRead read = BillsFileTest.read("From;To;kWh\n2026-01-01;2026-01-31;1\n2026-03-01;2026-03-12;1\n");
        assertThat(read.warnings())
                .extracting(Object::toString)
                .containsExactly(
                        "row 3: bills 12 days, which is not a month; found 2026-03-01 to 2026-03-12",
                        "row 3: does not follow the period before it; days between are not billed; found nothing for 2026-02");
    }

    @Test
    void oneBillAloneDoesNotShowWhatItsLastDayIs() {
        assertThat(BillsFileTest.read("From;To;kWh\n2026-01-05;2026-02-05;1\n").warnings())
                .extracting(Object::toString)
                .containsExactly(
                        "row 2: begins and ends on the same day of a month; if the end is a day of meter reading, the last"
                                + " day billed is the day before");
    }

    @Test
    void twoColumnsOfTheSame() {
        refused(
                "Month,kWh,Energy (kWh)\n2026-01,5,6\n",
                "column C (Energy (kWh)): gives the same as column B (kWh); rename or remove one of them");
    }

    @Test
    void noDates() {
        refused(
                "From,kWh\n2026-01-01,5\n",
                "row 1: does not say which days were billed; allowed: a column Month, or the columns From and To");
    }

    @Test
    void noNames() {
        refused(
                "2026-01,5,6\n2026-02,7,8\n",
                "no row names both the month and a figure, in commas, semicolons, tabs or pipes; found 2026-01,5,6; allowed: a row of"
                        + " names such as: Month, kWh, Lagging kvarh, Peak kW");
    }

    @Test
    void aQuotationMarkThatIsNeverClosed() {
        refused(
                "\"Month\"x,kWh\n2026-01,5\n",
                "a quotation mark opens a cell and does not close it, or text follows it; allowed: quotation marks around whole"
                        + " cells, doubled inside them");
    }

    @Test
    void bothDecimalMarksProvenLeavesTheUnclearCellsOpen() {
        refused(
                "Month;kWh;kW\n2026-01;1,234;10.5\n2026-02;7;10,5\n",
                "row 3, column C (kW): is written with a decimal comma, while 10.5 in row 2, column C (kW) is written with a point\n"
                        + "row 2, column B (kWh): may be 1234 or 1.234, and nothing in the file tells which; found 1,234; allowed:"
                        + " decimal = comma | point");
    }

    @Test
    void namesWithoutMonths() {
        refused("Month,kWh\n", "row 1: names the columns, but no month with figures follows");
    }

    @Test
    void decimalCommasBetweenCommas() {
        refused(
                "Month,kWh,kW\n2026-01,1234,5,40,5\n",
                "row 2, column D: stands beyond the last name; if figures have decimal commas, put them in quotes or separate the"
                        + " columns by semicolons; found 40");
    }

    @Test
    void aWorkbookInsteadOfText() {
        assertThatThrownBy(() -> BillsFile.read(new byte[] {'P', 'K', 3, 4, 20}, ReadingChoices.none()))
                .isInstanceOf(Refusal.class)
                .hasMessage(
                        "the file is a workbook, not a text file; found a workbook; allowed: the sheet saved as CSV or"
                                + " tab-separated text");
    }

    @Test
    void aFileTooLarge() {
        byte[] large = "Month,kWh\n".repeat(200_001).getBytes(StandardCharsets.UTF_8);
        assertThatThrownBy(() -> BillsFile.read(large, ReadingChoices.none()))
                .hasMessage(
                        "the file is larger than a bills file can be; found 2000010 bytes; allowed: at most 2000000 bytes");
    }

    @Test
    void tooManyRowsOrColumns() {
        refused(
                "Month,kWh\n".repeat(5_001),
                "the file has more rows than a bills file can have; allowed: at most 5000 rows");
        refused(",".repeat(500), "the file has more columns than a bills file can have; allowed: at most 500 columns");
    }

    private static void refused(String file, String message) {
        assertThatThrownBy(() -> BillsFileTest.read(file))
                .isInstanceOf(Refusal.class)
                .hasMessage(message);
    }
}
