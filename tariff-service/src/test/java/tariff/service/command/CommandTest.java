// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import tariff.service.http.Examples;

class CommandTest {
    private static final String RATE =
            Examples.path("examples/rates/millbrook-kva-service.json").toString();
    private static final String BILLS =
            Examples.path("examples/foundry/bills.json").toString();

    @TempDir
    private Path directory;

    private static Printed run(Object... arguments) {
        return Printed.by(arguments);
    }

    private String file(String name, String content) throws IOException {
        return Files.writeString(directory.resolve(name), content).toString();
    }

    @Test
    void aRateIsReadBackInWords() {
        Printed ran = run("check", RATE);
        assertThat(ran.exit()).isEqualTo(Exit.OK);
        assertThat(ran.err()).isEmpty();
        assertThat(ran.out())
                .startsWith("Millbrook kVA Service, prices in EUR, from 2025-01-01\n")
                .contains("\nEnergy: kWh, at 0.0985 per kWh.\n");
    }

    @Test
    void whatIsWrongWithARateIsSaidOneALineWithItsPlace() throws IOException {
        Printed ran = run(
                "check",
                file(
                        "wrong.json",
                        "{\"name\":\"A\",\"currency\":\"Eur\",\"lines\":[{\"name\":\"E\",\"quantity\":{\"energy\":\"kwh\"},\"price\":1}]}"));
        assertThat(ran.exit()).isEqualTo(Exit.FINDINGS);
        assertThat(ran.out()).isEmpty();
        assertThat(ran.err()).isEqualTo("""
                /currency: is not a currency code; found "Eur"; allowed: three capital letters, such as EUR (ISO 4217)
                /lines/0/quantity/energy: is not known; did you mean "kWh"?; found "kwh"; allowed: exported kWh, kVAh, kWh,\
                 lagging kvarh, leading kvarh
                """);
    }

    @Test
    void aFileThatIsNoJsonIsUnusable() throws IOException {
        String name = file("rate.json", "name: A");
        Printed ran = run("check", name);
        assertThat(ran.exit()).isEqualTo(Exit.UNUSABLE_FILE);
        assertThat(ran.err()).startsWith("rate.json: line 1, column 1: is not valid JSON: ");
    }

    @Test
    void aFileThatIsNotThereIsUnusable() {
        String nowhere = directory.resolve("none.json").toString();
        Printed ran = run("statement", RATE, nowhere);
        assertThat(ran.exit()).isEqualTo(Exit.UNUSABLE_FILE);
        assertThat(ran.err()).isEqualTo(nowhere + ": cannot be read; found no such file\n");
    }

    /** Own arithmetic: 231,900 × 0.0985 = 22,842.15; 918 × 9.80 = 8,996.40. */
    @Test
    void aStatementShowsItsWorkingBesideEachAmount() {
        assertThat(run("statement", RATE, BILLS).out()).startsWith("""
                Millbrook kVA Service, amounts in EUR

                2025-01
                  Standing charge            140.00  = 1 × 140
                  Energy                   22842.15  = 231900 kWh × 0.0985
                  Demand                    8996.40  = 918 kVA × 9.8
                  Primary metering credit         0  does not apply
                  Total                    31978.55
                """);
    }

    @Test
    void anOptionOfTheSiteMayBeSaidBesideTheFile() {
        // −2 % of 22,842.15 + 8,996.40, own arithmetic
        assertThat(run("statement", RATE, BILLS, "--option", "primary metered").out())
                .contains("  Primary metering credit   -636.77  = 31838.55 × -2 %\n");
    }

    @Test
    void aTableOfASpreadsheetIsBilledAndSaysHowItWasRead() throws IOException {
        Printed ran =
                run("statement", RATE, file("bills.csv", "Month;kWh;peak kVA\n2025-01;1000;20\n"), "--format", "csv");
        assertThat(ran.out().lines()).contains("2025-01-01,2025-01-31,Energy,98.50,yes,EUR");
        assertThat(ran.err()).contains("Separator: semicolon\n");
    }

    @Test
    void aTextThatASpreadsheetTakesForAFormulaStaysAText() {
        Csv csv = new Csv(java.util.List.of("=1+1", "-2.50", "say \"so\", please"));
        assertThat(csv.text()).isEqualTo("'=1+1,-2.50,\"say \"\"so\"\", please\"\r\n");
    }

    @ParameterizedTest
    @ValueSource(strings = {"text", "json", "csv"})
    void theSameQuestionIsPrintedTheSameWay(String format) {
        Printed once = run("assess", RATE, BILLS, "--fixed", "300", "--cost", "20000", "--format", format);
        assertThat(once.exit()).isEqualTo(Exit.OK);
        assertThat(run("assess", RATE, BILLS, "--fixed", "300", "--cost", "20000", "--format", format))
                .isEqualTo(once);
    }

    @Test
    void anAssessmentFitsInAHundredColumnsAndEndsWithItsCautions() {
        String out = run("assess", RATE, BILLS, "--steps", "50,50,100", "--cost", "20000", "--discount", "0.08")
                .out();
        assertThat(out.lines())
                .allSatisfy(line ->
                        assertThat(line.codePointCount(0, line.length())).isLessThanOrEqualTo(100));
        assertThat(out).contains("screening estimate", "lethal charge");
    }

    @Test
    void aProposalSaysWhatItsControllerAndItsTimeSwitchAreTold() {
        String proposal =
                Examples.path("examples/foundry/proposal-off-at-night.json").toString();
        String out = run("assess", RATE, BILLS, "--proposal", proposal).out();
        assertThat(out).contains("""
                The proposal: 100 kvar fixed and switched steps of 50, 100, 100 kvar after 5 minutes, at most 12
                    operations an hour, off Mon to Fri 22:00 to 06:00, cost 30500.00
                """, """
                - the year: a month's totals do not show what flows while the time switch keeps the bank off: the
                    low savings take as much of the kvarh to fall there as can be and the highest kVA and kvar too,
                    the high as little, the central in proportion to the hours (to remove it: interval data settle
                    it)
                - the year: a month's totals do not show how often the load changes: the switching delay and the
                    limit of operations an hour are not counted (to remove it: interval data settle it)
                - the year: a time switch keeps the whole bank off Mon to Fri 22:00 to 06:00; in the other hours the
                    fixed kvar are always on; the steps follow the load as far as whole steps can: the low savings
                    count two thirds of the smallest step, or half of a wider gap between two outputs, against them
                    in every hour, the central what the load curve tells, the high nothing
                """);
    }

    // options | what is said
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "--fixed 50 --off 22-6 | --off: is not from one time to another; found 22-6; allowed: two times of day with a hyphen between, such as 22:00-06:00",
                "--fixed 50 --off 25:00-06:00 | --off/from: is not a time of day; found \"25:00\"; allowed: hours and minutes, 00:00 to 24:00",
                "--fixed 50 --off 00:00-24:00 | --off: keeps the bank off all the time; found every day all day; allowed: a window that leaves the bank some hours",
                "--fixed 50 --delay 5 | does not hold together; allowed: \"switchingDelayMinutes\" and \"operationsPerHour\" only beside \"stepsKvar\"",
                "--steps 50 --delay 61 | /switchingDelayMinutes: is out of range; found 61; allowed: 0 to 60 minutes",
                "--steps 50 --operations-per-hour 0 | /operationsPerHour: is out of range; found 0; allowed: 1 to 10000 an hour"
            })
    void whatNoControllerOrTimeSwitchCanBeToldIsAFinding(String options, String said) {
        List<String> arguments = new ArrayList<>(List.of("assess", RATE, BILLS));
        arguments.addAll(List.of(options.split(" ")));
        Printed ran = Printed.by(arguments.toArray());
        assertThat(ran.exit()).isEqualTo(Exit.FINDINGS);
        assertThat(ran.err()).isEqualTo(said + "\n");
    }

    @Test
    void aBankOutOfRangeIsAFinding() {
        Printed ran = run("assess", RATE, BILLS, "--fixed", "1e999999999");
        assertThat(ran.exit()).isEqualTo(Exit.FINDINGS);
        assertThat(ran.err())
                .isEqualTo("/fixedKvar: is out of range; found 1E+999999999; allowed: 0 to 1000000 kvar\n");
    }

    @Test
    void anUnknownUnitIsAMistakeOnTheCommandLine() {
        Printed ran = run("statement", RATE, BILLS, "--agreed", "MW=3");
        assertThat(ran.exit()).isEqualTo(Exit.USAGE);
        assertThat(ran.err())
                .startsWith(
                        "Invalid value for option '--agreed' (UNIT=NUMBER): \"MW\" is no unit; one of: kWh, kvarh,");
    }
}
