// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigInteger;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ApparentTest {
    @ParameterizedTest
    @CsvSource({
        "0, 0, 0", // nothing
        "3, 4, 5", // Pythagorean triple
        "3, -4, 5", // leading
        "1, 1, 1", // own arithmetic: 1.414
        "2, 2, 3", // own arithmetic: 2.828
        "400000000, 300000000, 500000000",
    })
    void isTheRootOfTheSquaresRoundedHalfUp(long active, long reactive, long apparent) {
        assertThat(Apparent.of(active, reactive)).isEqualTo(apparent);
    }

    @Test
    void isExactAtEverySize() {
        Random random = new Random(7);
        for (int i = 0; i < 20_000; i++) {
            long active = random.nextLong() >>> (9 + random.nextInt(50));
            long reactive = random.nextLong() >> (9 + random.nextInt(50));
            BigInteger square = BigInteger.valueOf(active)
                    .pow(2)
                    .add(BigInteger.valueOf(reactive).pow(2));
            BigInteger twice =
                    square.shiftLeft(2).sqrt(); // the root of 4 n is twice the root, so its last bit is the half
            long expected = twice.add(BigInteger.ONE).shiftRight(1).longValueExact();
            assertThat(Apparent.of(active, reactive))
                    .as("%s, %s", active, reactive)
                    .isEqualTo(expected);
        }
    }
}
