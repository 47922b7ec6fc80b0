// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class DecimalsTest {
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '"',
            value = {
                ". | 3.17 | 3170000",
                ". | -0.5 | -500000",
                ". | +7 | 7000000",
                ". | 1,234.5 | 1234500000",
                ", | 1.234,5 | 1234500000",
                ", | 1'234,5 | 1234500000",
                ", | 3,17 | 3170000",
                ", | 1.234 | 1234000000",
                ". | 1e3 | 1000000000",
                ". | 0.0000005 | 1", // half up
                ". | 0.0000004 | 0",
                ". | 12.340000000000001 | 12340000",
            })
    void readsTheFigureToAMillionth(char mark, String text, long millionths) {
        assertThat(read(mark, text)).isEqualTo(millionths);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"x", "-", ".", "1.2.3", "1,5", "1e99", "--1", "NaN", "12a", "1,23,456", "99999999999999999"})
    void refusesWhatIsNoFigure(String text) {
        assertThat(read('.', text)).isEqualTo(Decimals.UNREADABLE);
    }

    @Test
    void nothingIsNotZero() {
        assertThat(read('.', "  ")).isEqualTo(Decimals.EMPTY);
    }

    @Test
    void agreesWithDecimalArithmeticOnAnyFigure() {
        Random random = new Random(3);
        for (int i = 0; i < 20_000; i++) {
            BigDecimal value = BigDecimal.valueOf(random.nextLong() >> (36 + random.nextInt(26)), random.nextInt(9));
            int scale = 3 + 3 * random.nextInt(2);
            BigDecimal expected = value.movePointRight(scale).setScale(0, RoundingMode.HALF_UP);
            char[] text = value.toPlainString().toCharArray();
            assertThat(new Decimals('.').read(text, 0, text.length, scale))
                    .as("%s", value)
                    .isEqualTo(expected.longValueExact());
        }
    }

    private static long read(char mark, String text) {
        return new Decimals(mark).read(text.toCharArray(), 0, text.length(), 6);
    }
}
