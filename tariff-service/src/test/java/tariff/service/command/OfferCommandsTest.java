// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import tariff.service.http.Examples;

/** Sizes, reviews and screens of the example offers, as they are asked for on the command line. */
class OfferCommandsTest {
    private static final String RATE = example("rates/millbrook-kva-service.json");
    private static final String BILLS = example("foundry/bills.json");
    private static final String FAIR = example("offers/tollgate-fair.json");
    private static final String INFLATED = example("offers/tollgate-inflated.json");
    private static final String DRIVES = example("offers/pak-nam-drives.json");

    @TempDir
    private Path directory;

    private static Printed run(Object... arguments) {
        return Printed.by(arguments);
    }

    private static String example(String name) {
        return Examples.path("examples/" + name).toString();
    }

    /** Column 1 of the table of claims: nothing in it holds a comma in quotes before the verdict. */
    private static List<String> verdicts(String rate, String bills, String offer) {
        return run("review", rate, bills, offer, "--format", "csv")
                .out()
                .lines()
                .skip(1)
                .map(row -> row.replaceFirst("^\"(?:[^\"]|\"\")*\",|^[^,]*,", ""))
                .map(row -> row.substring(0, row.indexOf(',')))
                .toList();
    }

    @Test
    void aFairOfferHoldsClaimByClaim() {
        assertThat(verdicts(RATE, BILLS, FAIR)).containsExactly("holds", "holds", "holds", "holds");
    }

    @Test
    void anInflatedOfferDoesNot() {
        assertThat(verdicts(RATE, BILLS, INFLATED))
                .containsExactly(
                        "beyond-rate",
                        "beyond-rate",
                        "holds-only-if",
                        "beyond-physics",
                        "beyond-physics",
                        "cannot-tell");
    }

    @Test
    void aSiteOfDrivesMustNotGetAPlainBank() {
        String rate = example("rates/pak-nam-bay.json");
        String bills = example("bills/pak-nam-bay.json");
        assertThat(verdicts(rate, bills, DRIVES)).containsExactly("beyond-physics", "beyond-physics");
        assertThat(run("review", rate, bills, DRIVES).words())
                .contains("This site must not get a plain bank: 45 % of the load is non-linear")
                .contains("STOP parallel resonance: ", "STOP detuning: non-linear load is 42.0 % of the transformer");
    }

    @Test
    void aReviewNamesTheSlipAndShowsTheWorkingAndTheCautions() {
        assertThat(run("review", RATE, BILLS, INFLATED).words())
                .startsWith("What the offer promises The offer says that the bank saves 21000.00 by \"kVA charge\" and"
                        + " 21000.00 by \"Power factor penalty\" a year Exceeds what the rate can give: this bank saves at"
                        + " most 22608.60 a year. Slip: the same kW or kvar is counted in more than one part")
                .contains("sum of the parts: 42000.00")
                .contains("lethal charge");
    }

    /** Own arithmetic: 14,000 + 40 × 60 = 16,400; nobody earns that back with 1,166.96 a year within 20 years at 8 %. */
    @Test
    void whereNoBankPaysThatIsSaidPlainly() {
        Printed ran = run(
                "size",
                example("rates/polder-grid-mv.json"),
                example("bills/polder-grid-mv.json"),
                "--prices",
                example("prices/medium-voltage.json"),
                "--discount",
                "0.08");
        assertThat(ran.exit()).isEqualTo(Exit.OK);
        assertThat(ran.words())
                .contains("Worth most none ")
                .contains("Worth most: no bank: even the best size, 40 kvar at 16400.00, saves only 1163.71 a year and"
                        + " loses 8194.88 over its life; it would pay below 205.13 per kvar.")
                .contains("Least regret: no bank at all is the calmest choice");
    }

    @Test
    void aSizingPutsItsAnswersSideBySideAndSaysWhatWouldSettleIt() {
        Printed ran = run(
                "size",
                RATE,
                BILLS,
                "--per-kvar",
                "40",
                "--discount",
                "0.08",
                "--shape",
                "automatic",
                "--increment",
                "30",
                "--most",
                "600");
        assertThat(ran.exit()).isEqualTo(Exit.OK);
        assertThat(ran.out().lines())
                .anyMatch(line -> line.startsWith("  Paid back soonest "))
                .anyMatch(line -> line.startsWith("  Smallest without penalty  none"))
                .anyMatch(line -> line.startsWith("  Worth most, low "))
                .anyMatch(line -> line.startsWith("  Least regret "))
                .anyMatch(line -> line.startsWith("- Demand: saves up to "))
                .allSatisfy(line ->
                        assertThat(line.codePointCount(0, line.length())).isLessThanOrEqualTo(100));
        assertThat(ran.words()).contains("interval data of kWh and kvarh settle it", "lethal charge");
    }

    @Test
    void aBankIsPutTogetherFromWhatCanBeBought() {
        Printed ran = run(
                "size",
                RATE,
                BILLS,
                "--per-kvar",
                "40",
                "--discount",
                "0.08",
                "--shape",
                "fixed",
                "--available",
                "25,50",
                "--units",
                "4",
                "--format",
                "csv");
        assertThat(ran.out().lines().skip(1).map(row -> row.substring(0, row.indexOf(','))))
                .containsExactly("25", "50", "75", "100", "125", "150", "175", "200");
    }

    @ParameterizedTest
    @ValueSource(strings = {"text", "json", "csv"})
    void everyScreenIsShownInEachFormat(String format) {
        Printed ran = run("screen", DRIVES, "--format", format);
        assertThat(ran.exit()).isEqualTo(Exit.OK);
        assertThat(ran.out())
                .contains(
                        "stored energy", "parallel resonance", "detuning", "generators", "losses", "needs the highest");
    }

    @Test
    void anAssessmentOfAProposalWithANetworkIsScreenedToo() throws IOException {
        String proposal = Files.writeString(
                        directory.resolve("proposal.json"),
                        "{\"bank\":{\"fixedKvar\":100},\"network\":{\"serviceVolts\":400,\"generators\":true}}")
                .toString();
        assertThat(run("assess", RATE, BILLS, "--proposal", proposal).words())
                .contains("LOOK CLOSER generators: generators can feed the bus: 100.0 kvar must be off while they do");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "--discount 0.08 | give either --prices or --per-kvar: there are no prices but your own",
                "--discount 8 --per-kvar 1 | /discountRate: is out of range; found 8; allowed: 0 to 1",
                "--discount 0 --per-kvar -1 | /perFixedKvar: is out of range; found -1; allowed: 0 to 1000000000",
                "--discount 0 --per-kvar 1 --available 0 | /availableKvar/0: is out of range; found 0; allowed: 0.01 to 1000000 kvar"
            })
    void aSizeThatCannotBeAskedIsAFinding(String options, String finding) {
        Printed ran = run((Object[]) ("size " + RATE + " " + BILLS + " " + options).split(" "));
        assertThat(ran.exit()).isEqualTo(Exit.FINDINGS);
        assertThat(ran.err().lines()).contains(finding);
    }

    @Test
    void aClaimThatNobodyKnowsIsNamedWithItsFile() throws IOException {
        String offer = Files.writeString(
                        directory.resolve("offer.json"), "{\"bank\":{\"fixedKvar\":100},\"claims\":[{\"kvars\":100}]}")
                .toString();
        Printed ran = run("review", RATE, BILLS, offer);
        assertThat(ran.exit()).isEqualTo(Exit.FINDINGS);
        assertThat(ran.err()).startsWith("offer.json#/claims/0: makes no claim that is known; did you mean \"kvar\"?");
    }
}
