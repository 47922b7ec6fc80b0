// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import tariff.rate.Rate;

/** Checks a rate and reads it back in words. */
@Command(
        name = "check",
        description = {
            "Checks a rate and reads it back in plain words, clause by clause, to hold beside the printed rate sheet.",
            "Everything that is wrong is said at once, each finding with its place in the file."
        },
        mixinStandardHelpOptions = true)
@SuppressWarnings("NullAway.Init") // picocli fills them in
final class CheckCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Parameters(paramLabel = "RATE", description = "the rate, a JSON file")
    private Path rate;

    @Option(names = "--format", description = "text or json (${DEFAULT-VALUE} unless said)", defaultValue = "text")
    private Format format;

    @Override
    public Integer call() {
        Rate.Checked checked = Files.check(rate);
        format.print(new CheckAnswer(checked), spec.commandLine().getOut());
        checked.findings().forEach(finding -> spec.commandLine().getErr().println(finding));
        spec.commandLine().getErr().flush();
        return checked.rate().isPresent() ? Exit.OK : Exit.FINDINGS;
    }
}
