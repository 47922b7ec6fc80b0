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
