// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.Random;

/** Invented banks for the tests. */
final class Ventures {
    private Ventures() {}

    /** 12 000 installed, saving 4 000 a year, 300 of upkeep, 10 years, 8 %. */
    static Venture project() {
        return new Venture(
                Investment.plain(money("12000"), money("300"), 10),
                new Savings(months("4000"), months("4000")),
                Outlook.level(money("0.08")));
    }

    static Venture withReplacement(Venture venture, int year, String cost) {
        Investment bank = venture.investment();
        return venture.with(new Investment(
                bank.purchase(),
                bank.installation(),
                bank.incentives(),
                bank.yearlyUpkeep(),
                bank.lifeYears(),
                List.of(new Replacement(year, money(cost))),
                bank.residual()));
    }

    static Venture undiscounted(Venture venture) {
        return venture.with(Outlook.level(Optional.empty()));
    }

    static Venture random(Random random) {
        Investment bank = new Investment(
                cents(random, 500_000, 3_000_000),
                cents(random, 0, 500_000),
                cents(random, 0, 200_000),
                cents(random, 0, 40_000),
                2 + random.nextInt(19),
                List.of(),
                cents(random, 0, 50_000));
        Savings savings = Savings.settledAtOnce(random.ints(12, 10_000, 90_000)
                .mapToObj(c -> BigDecimal.valueOf(c, 2))
                .toList());
        return new Venture(bank, savings, Outlook.level(BigDecimal.valueOf(1 + random.nextInt(20), 2)));
    }

    static BigDecimal cents(Random random, int least, int most) {
        return BigDecimal.valueOf(least + random.nextInt(most - least), 2);
    }

    /** A yearly amount in twelve parts that add up to it exactly. */
    static List<BigDecimal> months(String yearly) {
        BigDecimal part = money(yearly).divideToIntegralValue(BigDecimal.valueOf(12));
        List<BigDecimal> months = new ArrayList<>(Collections.nCopies(11, part));
        months.add(money(yearly).subtract(part.multiply(BigDecimal.valueOf(11))));
        return months;
    }

    static BigDecimal money(String amount) {
        return new BigDecimal(amount);
    }

    /** Amounts with blanks between them. */
    static List<BigDecimal> flows(String amounts) {
        return Arrays.stream(amounts.trim().split(" +")).map(BigDecimal::new).toList();
    }

    static <T> T known(Answer<T> answer) {
        return answer.fold(value -> value, reason -> {
            throw new AssertionError(reason);
        });
    }

    static String reason(Answer<?> answer) {
        return answer.fold(
                value -> {
                    throw new AssertionError("has a value: " + value);
                },
                reason -> reason);
    }
}
