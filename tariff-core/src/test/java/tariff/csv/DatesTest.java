// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** One cell as a date; ISO 8601 for years first, day first for dots, the rest common practice. */
class DatesTest {

    @ParameterizedTest(name = "{0} is {1}")
    @CsvSource(delimiter = '|', quoteCharacter = '"', textBlock = """
            2026-01             | 2026-01
            2026/01             | 2026-01
            202601              | 2026-01
            01/2026             | 2026-01
            1.2026              | 2026-01
            Jan 2026            | 2026-01
            January 2026        | 2026-01
            2026 Jan            | 2026-01
            Jan-26              | 2026-01
            Jan '26             | 2026-01
            Sept. 2026          | 2026-09
            janvier 2026        | 2026-01
            août 2026           | 2026-08
            März 2026           | 2026-03
            Mrz 26              | 2026-03
            enero de 2026       | 2026-01
            março de 2026       | 2026-03
            gennaio 2026        | 2026-01
            2026-01-31          | 2026-01-31
            20260131            | 2026-01-31
            2026-01-31 00:00:00 | 2026-01-31
            2026-01-31T23:59    | 2026-01-31
            1/13/2026 12:00 AM  | month-first 2026-01-13
            31.01.2026          | 2026-01-31
            3.4.26              | 2026-04-03
            31. 1. 2026         | 2026-01-31
            5 Jan 2026          | 2026-01-05
            5-Jan-26            | 2026-01-05
            Jan 5, 2026         | 2026-01-05
            1. Januar 2026      | 2026-01-01
            1er janvier 2026    | 2026-01-01
            5 de enero de 2026  | 2026-01-05
            13/04/2026          | day-first 2026-04-13
            04/13/2026          | month-first 2026-04-13
            03-04-2026          | 2026-04-03 or 2026-03-04
            03/04/26            | 2026-04-03 or 2026-03-04
            05/05/2026          | 2026-05-05
            31/02/2026          | no
            2026-02-30          | no
            31.02.2026          | no
            2026-13             | no
            03/26               | no
            26-Jan              | no
            46023               | no
            Jan                 | no
            2026                | no
            Jan Feb 2026        | no
            soon                | no
            """)
    void aCellAsADate(String text, String meaning) {
        DateCell cell = DateCell.of(text);
        String found = cell.month()
                .map(Object::toString)
                .or(() -> cell.proves()
                        .map(order -> order.word() + " " + cell.day(order).orElseThrow()))
                .or(() -> cell.dayFirst()
                        .map(day -> day
                                + (cell.isAmbiguous()
                                        ? " or " + cell.monthFirst().orElseThrow()
                                        : "")))
                .orElse("no");
        assertThat(found).isEqualTo(meaning);
    }

    @Test
    void aCellThatCanOnlyBeReadOneWayAnswersForAll() {
        BillsRead read = BillsFileTest.read("From,To,kWh\n03/04/2026,02/05/2026,1\n03/05/2026,13/06/2026,1\n");
        assertThat(read.months().get(0).period()).hasToString("2026-04-03 to 2026-05-02");
        assertThat(read.understood()).contains("Dates: day-first, shown by 13/06/2026 in row 3, column B (To)");
    }

    @Test
    void theOnlyOrderInWhichPeriodsFollowAnswers() {
        BillsRead read = BillsFileTest.read("From,To,kWh\n05/01/2026,04/02/2026,1\n05/02/2026,04/03/2026,1\n");
        assertThat(read.months().get(0).period()).hasToString("2026-01-05 to 2026-02-04");
        assertThat(read.understood())
                .contains("Dates: day-first; month-first they would not make periods that follow one another");
    }

    @Test
    void firstsOfMonthsAnswer() {
        assertThat(BillsFileTest.read("Month,kWh\n02/01/2026,1\n03/01/2026,1\n").months())
                .extracting(month -> month.period().toString())
                .containsExactly("2026-02", "2026-03");
    }

    @Test
    void aStatementDateThatNothingTellsIsAsked() {
        String file = "Month,kWh,Invoice date\n2026-01,5,03/04/2026\n";
        assertThatThrownBy(() -> BillsFileTest.read(file))
                .hasMessage(
                        "row 2, column C (Invoice date): may be 2026-04-03 or 2026-03-04, and nothing in the file tells which;"
                                + " found 03/04/2026; allowed: dates = day-first | month-first");
        BillsRead read =
                BillsFile.read(BillsFileTest.bytes(file), ReadingChoices.none().dates(DateOrder.MONTH_FIRST));
        assertThat(read.months().get(0).statementDate()).contains(java.time.LocalDate.of(2026, 3, 4));
        assertThat(read.understood()).contains("Dates: month-first, as chosen");
    }

    @Test
    void theFirstOfJanuaryNeedsNoAnswer() {
        assertThat(BillsFileTest.read("Month,kWh\n01/01/2026,5\n").months()).hasSize(1);
    }
}
