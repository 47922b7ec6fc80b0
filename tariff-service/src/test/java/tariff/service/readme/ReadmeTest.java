// SPDX-License-Identifier: Apache-2.0
package tariff.service.readme;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import picocli.CommandLine;
import tariff.correction.Estimate;
import tariff.service.command.Tariff;

/** What the README says is what happens. */
class ReadmeTest {
    private static final Path ROOT = Path.of("..").toAbsolutePath().normalize();
    private static final Pattern OUTPUT = Pattern.compile("<!-- output: (.*?) -->\n```text\n(.*?)```", Pattern.DOTALL);
    private static final Pattern SHELL = Pattern.compile("```sh\n(.*?)```", Pattern.DOTALL);
    private static final Pattern JAVA = Pattern.compile("```java\n(.*?)```", Pattern.DOTALL);

    private static String readme() {
        try {
            return Files.readString(ROOT.resolve("README.md"));
        } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
    }

    static Stream<String> commandsWithOutput() {
        return OUTPUT.matcher(readme()).results().map(result -> result.group(1));
    }

    static Stream<String> commands() {
        return SHELL.matcher(readme())
                .results()
                .flatMap(result -> result.group(1).lines())
                .filter(line -> line.startsWith("tariff-service ") && !line.contains(" serve "))
                .map(line -> line.substring("tariff-service ".length()));
    }

    @ParameterizedTest
    @MethodSource("commandsWithOutput")
    void theOutputShownIsTheOutput(String command) {
        Matcher shown = Pattern.compile(
                        Pattern.quote("<!-- output: " + command + " -->\n```text\n") + "(.*?)```", Pattern.DOTALL)
                .matcher(readme());
        assertThat(shown.find()).isTrue();
        assertThat(run(command)).isEqualTo(shown.group(1));
    }

    @ParameterizedTest
    @MethodSource("commands")
    void everyCommandAnswers(String command) {
        assertThat(run(command)).isNotBlank();
    }

    @Test
    void bothSetUpCommandsStandThere() {
        assertThat(readme())
                .contains(
                        "mvn -q -ntp -DskipTests package && java -jar tariff-service/target/tariff-service.jar assess ")
                .contains("mvn -ntp verify");
    }

    @Test
    void theLinesOfJavaAreTheOnesThatCompile() throws IOException {
        Matcher lines = JAVA.matcher(readme());
        assertThat(lines.find()).isTrue();
        String source = Files.readString(Path.of("src/test/java/tariff/service/readme/FiveLines.java"));
        String compiled = source.substring(source.indexOf("// from here\n") + 13, source.indexOf("        // to here"))
                .replaceAll("(?m)^        ", "")
                .replaceAll("root\\.resolve\\((\".*?\")\\)", "Path.of($1)");
        assertThat(lines.group(1)).isEqualTo(compiled);
        assertThat(FiveLines.run(ROOT).savings(Estimate.HIGH).settledYearTotal())
                .isPositive();
    }

    private static String run(String command) {
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        CommandLine line = Tariff.commandLine().setOut(new PrintWriter(out)).setErr(new PrintWriter(err));
        List<String> words = new ArrayList<>(Arrays.asList(command.split(" ")));
        words.replaceAll(
                word -> word.startsWith("examples/") ? ROOT.resolve(word).toString() : word);
        assertThat(line.execute(words.toArray(String[]::new)))
                .as(err.toString())
                .isZero();
        return out.toString();
    }
}
