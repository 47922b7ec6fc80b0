// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.notice.Refusal;

/** One cell as a number, with a decimal point and with a decimal comma; own arithmetic, the grouping rules are common practice. */
class NumbersTest {

    @ParameterizedTest(name = "{0} is {1} with a point, {2} with a comma")
    @CsvSource(delimiter = '|', quoteCharacter = '"', textBlock = """
            1234           | 1234        | 1234
            1234.5         | 1234.5      | no
            1234,5         | no          | 1234.5
            1,234          | 1234        | 1.234
            1.234          | 1.234       | 1234
            0.123          | 0.123       | no
            0,123          | no          | 0.123
            .95            | 0.95        | no
            1,234.56       | 1234.56     | no
            1.234,56       | no          | 1234.56
            1.234.567      | no          | 1234567
            1,234,567      | 1234567     | no
            1,23,456       | 123456      | no
            1,23,456.7     | 123456.7    | no
            12,34,567      | 1234567     | no
            1 234          | 1234        | 1234
            1 234,5        | no          | 1234.5
            1 234 567.8    | 1234567.8   | no
            1'234          | 1234        | 1234
            1’234.50       | 1234.50     | no
            1'234.567      | 1234.567    | no
            12345,678      | no          | 12345.678
            1234,567       | no          | 1234.567
            12 34          | no          | no
            1'23           | no          | no
            1,2,3          | no          | no
            1.2.3          | no          | no
            1,234 567      | no          | no
            1.5E+03        | 1500        | no
            1E400          | no          | no
            1234567890123456789 | no     | no
            12 kWh         | 12          | 12
            1,5 MWh        | no          | 1.5
            12 bananas     | no          | no
            € 1,234.50     | 1234.50     | no
            1.234,50 €     | no          | 1234.50
            CHF 1'234.50   | 1234.50     | no
            R$ 1.234,50    | no          | 1234.50
            Rs. 1,23,456   | 123456      | no
            -5             | -5          | -5
            −5             | -5          | -5
            5-             | -5          | -5
            (5)            | -5          | -5
            -€5            | -5          | -5
            (5             | no          | no
            --5            | no          | no
            +5             | 5           | 5
            87 %           | 87          | 87
            12.            | no          | no
            1 or 2         | no          | no
            """)
    void aCellWithEachMark(String text, String point, String comma) {
        NumberCell cell = NumberCell.of(text);
        assertThat(cell.point().map(value -> value.toPlainString()).orElse("no"))
                .isEqualTo(point);
        assertThat(cell.comma().map(value -> value.toPlainString()).orElse("no"))
                .isEqualTo(comma);
    }

    @ParameterizedTest
    @CsvSource({"n/a", "N/A", "-", "–", "—", "#N/A", "k.A.", "n.a.", "- €"})
    void cellsWithoutAFigure(String text) {
        assertThat(NumberCell.isAbsent(text)).isTrue();
    }

    @Test
    void spacesOfEveryKindGroupDigits() {
        String file = "Month;kWh\n2026-01;1\u00a0234\u00a0567\n2026-02;1\u202f234\u202f567\n2026-03;1 234 567\n";
        assertThat(BillsFileTest.read(file).months())
                .allSatisfy(month -> assertThat(month.totals()
                                .get(tariff.meter.Register.ENERGY_KWH)
                                .orElseThrow()
                                .toPlainString())
                        .isEqualTo("1234567"));
    }

    @Test
    void whatNothingInTheFileTellsIsAskedOnce() {
        assertThatThrownBy(() -> BillsFileTest.read("Month;kWh;kW\n2026-01;1,234;500\n2026-02;2,345;500\n"))
                .isInstanceOf(Refusal.class)
                .hasMessage(
                        "row 2, column B (kWh): may be 1234 or 1.234, and nothing in the file tells which (1 more like it);"
                                + " found 1,234; allowed: decimal = comma | point");
    }

    @Test
    void anotherCellAnswers() {
        assertThat(energy("Month;kWh;PF\n2026-01;1,234;0.87\n", ReadingChoices.none()))
                .isEqualTo("1234");
        assertThat(energy("Month;kWh;PF\n2026-01;1,234;0,87\n", ReadingChoices.none()))
                .isEqualTo("1.234");
        assertThat(energy("Month;kWh\n2026-01;1,234\nTotal;1,234.0\n", ReadingChoices.none()))
                .isEqualTo("1234");
    }

    @Test
    void theCallerAnswers() {
        String file = "Month;kWh\n2026-01;1,234\n";
        assertThat(energy(file, ReadingChoices.none().decimal(DecimalMark.POINT)))
                .isEqualTo("1234");
        assertThat(energy(file, ReadingChoices.none().decimal(DecimalMark.COMMA)))
                .isEqualTo("1.234");
    }

    @Test
    void aCellAgainstTheAnswerIsRefused() {
        assertThatThrownBy(() -> energy(
                        "Month;kWh\n2026-01;1234.5\n", ReadingChoices.none().decimal(DecimalMark.COMMA)))
                .hasMessage(
                        "row 2, column B (kWh): is not a number if the decimal mark is a comma; found 1234.5; allowed: a number"
                                + " such as 1234.5; nothing or n/a where there is no figure");
    }

    @Test
    void megawattHoursStayExact() {
        assertThat(energy("Month;MWh\n2026-01;1234.5678\n", ReadingChoices.none()))
                .isEqualTo("1234567.8000");
        assertThat(energy("Month;kWh\n2026-01;1.5 MWh\n", ReadingChoices.none()))
                .isEqualTo("1500.0");
    }

    private static String energy(String file, ReadingChoices choices) {
        return BillsFile.read(BillsFileTest.bytes(file), choices)
                .months()
                .get(0)
                .totals()
                .get(tariff.meter.Register.ENERGY_KWH)
                .orElseThrow()
                .toPlainString();
    }
}
