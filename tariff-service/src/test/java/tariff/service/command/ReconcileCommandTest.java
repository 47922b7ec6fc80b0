// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tariff.service.http.Examples;

/**
 * Bills of an invented joinery, charged with the power factor rounded to 0.01 where the rate says 0.001; in September 98,630 kvarh were
 * charged and 96,830 written down.
 */
class ReconcileCommandTest {
    private static final String RATE =
            Examples.path("examples/rates/harbourside-large-service.json").toString();
    private static final String BILLS =
            Examples.path("examples/paid/harbourside.json").toString();

    @TempDir
    private Path directory;

    /**
     * Own arithmetic for February: 112,900 kWh and 80,380 kvarh are 0.81463. 409 kW × 0.95 ÷ 0.81 = 479.7, charged as 480 kW; ÷ 0.815 =
     * 476.7, so 477 kW. 3 kW × 11.40 = 34.20; 3 kW × 200 h × (0.1125 − 0.0890) = 14.10; 6 % of both = 2.90.
     */
    @Test
    void eachMonthIsShownThenTheLinesOfThoseThatDiffer() {
        assertThat(Printed.by("reconcile", RATE, BILLS).fits().out())
                .startsWith("""
                        Brackwater Joinery under Harbourside Large Service, amounts in EUR

                        Month      Billed  Recomputed  Difference
                        2025-01  19757.08    19757.08        0.00  agrees to the cent
                        2025-02  19460.94    19409.74      +51.20  does not agree
                        2025-03  20529.09    20512.03      +17.06  agrees within rounding
                        """)
                .contains("""
                        5 of 12 months agree; the others differ by 346.33 in all, signs left out.

                        2025-02, line by line
                          Line               Billed  Recomputed  Difference
                          Standing charge     65.80       65.80        0.00  agrees to the cent
                          Energy           12304.10    12290.00      +14.10  does not agree
                          Demand            5472.00     5437.80      +34.20  does not agree
                          Reactive energy    517.48      517.48        0.00  agrees to the cent
                          Tax               1101.56     1098.66       +2.90  does not agree
                        """);
    }

    @Test
    void explanationsAreRankedAndNoneIsCertain() {
        Printed printed = Printed.by("reconcile", RATE, BILLS);
        assertThat(printed.exit()).isEqualTo(Exit.OK);
        assertThat(printed.out()).contains("""
                What would make them agree, the best match first; found by trying, so ask the utility
                - the power factor rounded half up to 0.01 would make 11 of 12 months agree to the cent; as the rate
                    stands 5 of 12 months agree, 2 of them to the cent
                - 2025-09 would agree to the cent with lagging kvarh 98,630 for 96,830 (digits swapped)
                """);
        assertThat(printed.out()).doesNotContain("Nothing was found");
    }

    @Test
    void doubtsComeBeforeAnythingWorkedOut() throws IOException {
        String bills = file("""
                { "site": { "agreed": { "kW": 420 } }, "months": [
                  { "month": "2025-01", "energyKwh": 118400, "laggingKvarh": 82880, "peakKw": 90, "charged": { "total": 12345.67 } } ] }
                """);
        String out = Printed.by("reconcile", RATE, bills).fits().out();
        assertThat(out.indexOf("Doubtful in the readings\n- 2025-01: "))
                .isPositive()
                .isLessThan(out.indexOf("\nMonth "));
    }

    /** February's energy as 10,304.10 in place of 12,304.10: no digits of a reading and no change of the rate do that. */
    @Test
    void aMonthThatNothingExplainsIsNamed() throws IOException {
        String bills = file(Examples.text("examples/paid/harbourside.json").replace("12304.10", "10304.10"));
        assertThat(Printed.by("reconcile", RATE, bills).fits().out())
                .contains("\n- the power factor rounded half up to 0.01 would make 10 of 12 months agree to the cent;")
                .contains("\nNothing was found that would make these agree\n- 2025-02: +51.20\n");
    }

    @Test
    void billsWithoutAmountsAreAFinding() {
        Printed printed = Printed.by(
                "reconcile",
                RATE,
                Examples.path("examples/bills/harbourside-large-service.json").toString());
        assertThat(printed.exit()).isEqualTo(Exit.FINDINGS);
        assertThat(printed.out()).isEmpty();
        assertThat(printed.err())
                .isEqualTo(
                        "the bills: no month says what was charged; allowed: \"charged\" with \"total\", \"lines\" or both"
                                + " in at least one month, or a column of a table with the amounts\n");
    }

    @Test
    void aTableHasARowForEachBillAndForEachLine() {
        assertThat(Printed.by("reconcile", RATE, BILLS, "--format", "csv").out().lines())
                .hasSize(1 + 12 * 6)
                .startsWith(
                        "from,to,line,charged,recomputed,difference,verdict,currency",
                        "2025-01-01,2025-01-31,,19757.08,19757.08,0.00,agrees to the cent,EUR",
                        "2025-01-01,2025-01-31,Standing charge,72.85,72.85,0.00,agrees to the cent,EUR");
    }

    @ParameterizedTest
    @ValueSource(strings = {"text", "json", "csv"})
    void theSameQuestionIsPrintedTheSameWay(String format) {
        Printed once = Printed.by("reconcile", RATE, BILLS, "--format", format);
        assertThat(once.exit()).isEqualTo(Exit.OK);
        assertThat(Printed.by("reconcile", RATE, BILLS, "--format", format)).isEqualTo(once);
    }

    private String file(String content) throws IOException {
        return Files.writeString(directory.resolve("bills.json"), content).toString();
    }
}
