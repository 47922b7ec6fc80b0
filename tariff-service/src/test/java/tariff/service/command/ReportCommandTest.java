// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tariff.service.http.Examples;

class ReportCommandTest {
    private static final String RATE =
            Examples.path("examples/rates/harbourside-large-service.json").toString();
    private static final String BILLS =
            Examples.path("examples/foundry/bills.json").toString();

    @TempDir
    private Path directory;

    private static Printed run(Object... arguments) {
        return Printed.by(arguments);
    }

    @Test
    void theReportIsWrittenWhereItIsAskedFor() throws IOException {
        Path file = directory.resolve("report.html");
        Printed ran = run(
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
        assertThat(ran.err()).isEmpty();
        assertThat(ran.exit()).isEqualTo(Exit.OK);
        assertThat(ran.out()).isEmpty();
        assertThat(Files.readString(file))
                .startsWith("<!DOCTYPE html>\n")
                .contains(
                        "Would a capacitor bank of 200 kvar pay for Tollgate Foundry under the rate Harbourside Large Service?")
                .contains("dated 2026-03-31.</p>");
    }

    @Test
    void withoutAFileItGoesToTheStandardOutput() {
        Printed ran = run("report", RATE, BILLS, "--fixed", "100");
        assertThat(ran.exit()).isEqualTo(Exit.OK);
        assertThat(ran.out())
                .startsWith("<!DOCTYPE html>\n")
                .contains("no price is given")
                .doesNotContain("dated");
    }

    @Test
    void aPlaceThatCannotBeWrittenIsNamed() {
        Path nowhere = directory.resolve("none").resolve("report.html");
        Printed ran = run("report", RATE, BILLS, "--fixed", "100", "-o", nowhere.toString());
        assertThat(ran.exit()).isEqualTo(Exit.UNUSABLE_FILE);
        assertThat(ran.err()).isEqualTo(nowhere + ": cannot be written\n");
    }

    @Test
    void anOffersClaimsAndTheScreensOfItsPlaceStandInTheReport() {
        String bills = Examples.path("examples/bills/pak-nam-bay.json").toString();
        String rate = Examples.path("examples/rates/pak-nam-bay.json").toString();
        String offer = Examples.path("examples/offers/pak-nam-drives.json").toString();
        Printed ran = run("report", rate, bills, "--offer", offer);
        assertThat(ran.err()).isEmpty();
        assertThat(ran.exit()).isEqualTo(Exit.OK);
        assertThat(ran.out())
                .contains("this site must not get a plain bank")
                .contains("parallel resonance")
                .doesNotContain("Nothing was screened");
    }
}
