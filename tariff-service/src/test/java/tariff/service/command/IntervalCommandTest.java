// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
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

    @Test
    void theReactiveDemandIsDrawnWithTheBankInIt() throws IOException {
        Path file = directory.resolve("curve.svg");
        run("assess", "--fixed", "150", "--duration-chart", file.toString());
        assertThat(Files.readString(file))
                .startsWith("<svg")
                .contains("bank 150 kvar", "sent back by the bank", "8,760 hours");
    }
}
