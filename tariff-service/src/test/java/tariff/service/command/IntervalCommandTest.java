// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.math.BigDecimal;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import picocli.CommandLine;
import tariff.service.http.Examples;

/** The example cold store, whose rate counts by the hour. */
class IntervalCommandTest {
    @TempDir
    private Path directory;

    private static String run(String command, String... more) {
        List<String> arguments = new ArrayList<>(List.of(
                command,
                Examples.path("examples/rates/ilha-verde-hourly.json").toString(),
                "--intervals",
                Examples.path("examples/intervals/palmeira-cold-store.csv").toString(),
                "--zone",
                "America/Sao_Paulo"));
        arguments.addAll(List.of(more));
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        CommandLine line = Tariff.commandLine();
        line.setOut(new PrintWriter(out)).setErr(new PrintWriter(err));
        assertThat(line.execute(arguments.toArray(new String[0]))).isEqualTo(Exit.OK);
        assertThat(err.toString()).isEmpty();
        return out.toString();
    }

    @Test
    void theBankIsShownMonthByMonthWithItsSteps() {
        String out = run("assess", "--steps", "50,50,100", "--cost", "90000");
        assertThat(out)
                .contains("The bank in service, from the interval data\n")
                .containsPattern("Steps switched in or out \\d+ times \\(\\d+, \\d+, \\d+ by step\\)")
                .contains("counts by the hour");
        assertThat(out.lines())
                .allSatisfy(line ->
                        assertThat(line.codePointCount(0, line.length())).isLessThanOrEqualTo(100));
    }

    /** What a time switch and a controller are told shows in what the bank did; the figures themselves are checked in the core. */
    @Test
    void aTimeSwitchAndAControllerAreHeardOnIntervalData() {
        int free = leadingCreated(run("assess", "--fixed", "150"));
        assertThat(leadingCreated(run("assess", "--fixed", "150", "--off", "22:00-06:00")))
                .isLessThan(free / 2);
        int quick = operations(run("assess", "--steps", "50,50,100"));
        assertThat(operations(run("assess", "--steps", "50,50,100", "--delay", "60")))
                .isLessThan(quick);
        assertThat(operations(run("assess", "--steps", "50,50,100", "--operations-per-hour", "1")))
                .isLessThan(quick);
        // an hour's data tell nothing of ten minutes
        assertThat(operations(run("assess", "--steps", "50,50,100", "--delay", "10")))
                .isEqualTo(quick);
    }

    private static int leadingCreated(String out) {
        return number(out, "Leading kvarh that the bank creates: (\\d+)");
    }

    private static int operations(String out) {
        return number(out, "switched in or out (\\d+) times");
    }

    private static int number(String out, String pattern) {
        Matcher found = Pattern.compile(pattern).matcher(out);
        assertThat(found.find()).isTrue();
        return Integer.parseInt(found.group(1));
    }

    @Test
    void aStatementSaysWhatTheMonthsTotalsWouldHaveSaid() {
        assertThat(run("statement"))
                .contains("Reactive excess")
                .contains("2025-01 to 2025-12: the rate counts by the hour")
                .contains("good hours");
    }

    /** The year's penalty is the sum of what the statements charge as reactive excess, all of it for being below 0.92. */
    @Test
    void theClausesBiteHourByHour() {
        assertThat(run("clauses", "--kvar", "25", "--demand-minutes", "60", "--sliding"))
                .contains("  Reactive excess  43560.31  43560.31  43560.31\n", "Next 25 kvar", "counts by the hour");
        assertThat(run("statement", "--format", "csv")
                        .lines()
                        .filter(row -> row.contains(",Reactive excess,"))
                        .map(row -> new BigDecimal(row.split(",")[3]))
                        .reduce(BigDecimal.ZERO, BigDecimal::add))
                .isEqualByComparingTo("43560.31");
    }

    @Test
    void periodsBeginOnTheDayTheMeterIsRead() {
        assertThat(run("statement", "--read-on", "14").lines().filter(line -> line.startsWith("2025-")))
                .hasSize(13)
                .startsWith("2025-01-01 to 2025-01-13", "2025-01-14 to 2025-02-13")
                .endsWith("2025-12-14 to 2025-12-31");
        assertThat(run("statement", "--read-on", "14"))
                .contains("- 2025-01-01 to 2025-12-31: the rate counts by the hour")
                .contains("- 2024-12-14 to 2025-01-13, 2025-12-14 to 2026-01-13: the data hold only part");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "--read-on=29 | /readOn: is out of range; found 29; allowed: 1 to 28, a day that every month has",
                "--demand-minutes=3 | /demandMinutes: is out of range; found 3; allowed: 5 to 60 minutes",
                "--demand-minutes=45 | /demandMinutes: is not a time that peaks of these data can be averaged over; found 45;"
                        + " allowed: a multiple of 60 minutes that divides an hour",
                "--column=leading=kVAh | headers: there is no column \"kVAh\" for leading kvarh",
                "--sliding | does not hold together; allowed: a sliding demand with the minutes that it is averaged over",
            })
    void whatIntervalsCannotGiveIsAFinding(String option, String finding) {
        Printed printed = Printed.by(
                "statement",
                Examples.path("examples/rates/ilha-verde-hourly.json").toString(),
                "--intervals",
                Examples.path("examples/intervals/palmeira-cold-store.csv").toString(),
                "--zone",
                "America/Sao_Paulo",
                option);
        assertThat(printed.exit()).isEqualTo(Exit.FINDINGS);
        assertThat(printed.err()).isEqualTo(finding + "\n");
    }

    @Test
    void whatIsSaidOfIntervalsIsNotPassedOverInSilenceBesideBills() {
        Printed printed = Printed.by(
                "statement",
                Examples.path("examples/rates/harbourside-large-service.json"),
                Examples.path("examples/foundry/bills.json"),
                "--zone=UTC",
                "--sliding");
        assertThat(printed.exit()).isEqualTo(Exit.FINDINGS);
        assertThat(printed.err().lines())
                .containsExactlyInAnyOrder(
                        "--zone is said of interval data, and the file holds bills",
                        "--sliding is said of interval data, and the file holds bills");
    }

    @Test
    void theReactiveDemandIsDrawnWithTheBankInIt() throws IOException {
        Path file = directory.resolve("curve.svg");
        run("assess", "--fixed", "150", "--duration-chart", file.toString());
        assertThat(Files.readString(file))
                .startsWith("<svg")
                .contains("bank 150 kvar", "sent back by the bank", "8,760 hours");
    }
}
