// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tariff.service.http.Examples;

/** An invented mill on a cliff: above 20 % of the kWh, all lagging kvarh are charged. */
class ClausesCommandTest {
    private static final String RATE =
            Examples.path("examples/rates/kara-liman-cliff.json").toString();
    private static final String BILLS =
            Examples.path("examples/bills/kara-liman-cliff.json").toString();

    @TempDir
    private Path directory;

    /**
     * Own arithmetic for January: 61,990 kvarh are above 0.20 × 258,100 = 51,620, so 61,990 × 1.1874 = 73,606.93, and 20 % tax on it =
     * 14,721.38. At the cliff tan φ = 0.20, so the power factor is 1 ÷ √1.04 = 0.9805807; 662 kW × (0.24018 − 0.20) = 26.6 kvar.
     */
    @Test
    void aMonthShowsWhatItsClausesCostAndWhereTheBillJumps() {
        Printed printed = Printed.by("clauses", RATE, BILLS, "--kvar", "25").fits();
        assertThat(printed.exit()).isEqualTo(Exit.OK);
        assertThat(printed.out())
                .startsWith("Kara Liman Yarn Mill under Kara Liman Industry, amounts in TRY\n")
                .contains("  Next 25 kvar  Ends at PF  kvar\n")
                .contains("""

                        2025-01
                          Line                 Billed   Penalty  To unity
                          Inductive energy   73606.93  73606.93  73606.93
                          Value added tax   184831.53  14721.38  14721.38
                          Next step: reaching power factor 0.9805807 (27 kvar more) takes 73552.42 off the bill at once.
                        """)
                .contains("""

                        2025-02
                          No line moves with reactive load.
                        """)
                .contains("screening estimate", "lethal charge");
    }

    @Test
    void aTableHasARowForEachMonthAndForEachLine() {
        assertThat(Printed.by("clauses", RATE, BILLS, "--format", "csv").out().lines())
                .hasSize(1 + 12 * 6)
                .allSatisfy(row ->
                        assertThat(row.chars().filter(each -> each == ',')).hasSize(14))
                .contains("2025-01-01,2025-01-31,Inductive energy,73606.93,73606.93,73606.93,,,,,,,,,");
    }

    @ParameterizedTest
    @ValueSource(strings = {"text", "json", "csv"})
    void theSameQuestionIsPrintedTheSameWay(String format) {
        Printed once = Printed.by("clauses", RATE, BILLS, "--format", format);
        assertThat(once.exit()).isEqualTo(Exit.OK);
        assertThat(Printed.by("clauses", RATE, BILLS, "--format", format)).isEqualTo(once);
    }

    @ParameterizedTest
    @ValueSource(strings = {"0", "-5", "1000001"})
    void kvarOutOfRangeAreAFinding(String kvar) {
        Printed printed = Printed.by("clauses", RATE, BILLS, "--kvar", kvar);
        assertThat(printed.exit()).isEqualTo(Exit.FINDINGS);
        assertThat(printed.err())
                .isEqualTo("/kvar: is out of range; found " + kvar + "; allowed: above 0, at most 1000000 kvar\n");
    }

    @Test
    void chartsAreWrittenWhereTheyAreAskedFor() throws Exception {
        Path charts = directory.resolve("charts");
        Printed printed = Printed.by("clauses", RATE, BILLS, "--charts", charts.toString());
        assertThat(printed.err())
                .isEqualTo("written: " + charts.resolve("bill.svg") + "\nwritten: " + charts.resolve("savings.svg")
                        + "\n");
        assertThat(names(charts)).containsExactly("bill.svg", "savings.svg");
        for (String name : names(charts)) {
            assertThat(DocumentBuilderFactory.newInstance()
                            .newDocumentBuilder()
                            .parse(charts.resolve(name).toFile())
                            .getDocumentElement()
                            .getTagName())
                    .isEqualTo("svg");
        }
    }

    @Test
    void anAssessmentWithAPriceHasAChartOfCashToo() throws IOException {
        Printed.by("assess", RATE, BILLS, "--fixed", "60", "--charts", directory.toString());
        assertThat(names(directory)).containsExactly("bill.svg", "savings.svg");
        Printed.by("assess", RATE, BILLS, "--fixed", "60", "--cost", "90000", "--charts", directory.toString());
        assertThat(names(directory)).containsExactly("bill.svg", "cash.svg", "savings.svg");
    }

    @Test
    void aDirectoryThatCannotBeMadeIsSaid() throws IOException {
        Path taken = Files.writeString(directory.resolve("taken"), "");
        Printed printed = Printed.by("clauses", RATE, BILLS, "--charts", taken.toString());
        assertThat(printed.exit()).isEqualTo(Exit.UNUSABLE_FILE);
        assertThat(printed.err()).isEqualTo(taken.resolve("bill.svg") + ": cannot be written\n");
    }

    private static List<String> names(Path directory) throws IOException {
        try (Stream<Path> files = Files.list(directory)) {
            return files.map(each -> each.getFileName().toString()).sorted().toList();
        }
    }
}
