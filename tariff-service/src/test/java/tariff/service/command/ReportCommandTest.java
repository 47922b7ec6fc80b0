// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import picocli.CommandLine;
import tariff.service.http.Examples;

class ReportCommandTest {
    private static final String RATE =
            Examples.path("examples/rates/harbourside-large-service.json").toString();
    private static final String BILLS =
            Examples.path("examples/foundry/bills.json").toString();

    @TempDir
    private Path directory;

    private record Ran(int exit, String out, String err) {}

    private static Ran run(String... arguments) {
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        CommandLine line = Tariff.commandLine();
        line.setOut(new PrintWriter(out)).setErr(new PrintWriter(err));
        int exit = line.execute(arguments);
        return new Ran(exit, out.toString(), err.toString().replace("\r", ""));
    }

    @Test
    void theReportIsWrittenWhereItIsAskedFor() throws IOException {
        Path file = directory.resolve("report.html");
        Ran ran = run(
                "report",
                RATE,
                BILLS,
                "--steps",
                "50,50,100",
                "--cost",
                "9500",
                "--date",
                "2026-03-31",
                "-o",
                file.toString());
        assertThat(ran.err).isEmpty();
        assertThat(ran.exit).isEqualTo(Exit.OK);
        assertThat(ran.out).isEmpty();
        assertThat(Files.readString(file))
                .startsWith("<!DOCTYPE html>\n")
                .contains(
                        "Would a capacitor bank of 200 kvar pay for Tollgate Foundry under the rate Harbourside Large Service?")
                .contains("dated 2026-03-31.</p>");
    }

    @Test
    void withoutAFileItGoesToTheStandardOutput() {
        Ran ran = run("report", RATE, BILLS, "--fixed", "100");
        assertThat(ran.exit).isEqualTo(Exit.OK);
        assertThat(ran.out)
                .startsWith("<!DOCTYPE html>\n")
                .contains("no price is given")
                .doesNotContain("dated");
    }

    @Test
    void aPlaceThatCannotBeWrittenIsNamed() {
        Path nowhere = directory.resolve("none").resolve("report.html");
        Ran ran = run("report", RATE, BILLS, "--fixed", "100", "-o", nowhere.toString());
        assertThat(ran.exit).isEqualTo(Exit.UNUSABLE_FILE);
        assertThat(ran.err).isEqualTo(nowhere + ": cannot be written\n");
    }

    @Test
    void anOffersClaimsAndTheScreensOfItsPlaceStandInTheReport() {
        String bills = Examples.path("examples/bills/pak-nam-bay.json").toString();
        String rate = Examples.path("examples/rates/pak-nam-bay.json").toString();
        String offer = Examples.path("examples/offers/pak-nam-drives.json").toString();
        Ran ran = run("report", rate, bills, "--offer", offer);
        assertThat(ran.err).isEmpty();
        assertThat(ran.exit).isEqualTo(Exit.OK);
        assertThat(ran.out)
                .contains("this site must not get a plain bank")
                .contains("parallel resonance")
                .doesNotContain("Nothing was screened");
    }
}
