// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Asks what could go wrong with a bank at its place. */
@Command(
        name = "screen",
        description = {
            "Asks what could go wrong with a capacitor bank at its place, screen by screen.",
            "A screening estimate, not a design."
        },
        mixinStandardHelpOptions = true)
@SuppressWarnings("NullAway.Init") // picocli fills them in
final class ScreenCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Parameters(
            index = "0",
            paramLabel = "SITE",
            description = "\"bank\" and \"network\", a JSON file; a proposal or an offer with a network will do")
    private Path site;

    @Option(names = "--format", description = "text, json or csv (${DEFAULT-VALUE} unless said)", defaultValue = "text")
    private Format format;

    @Override
    public Integer call() {
        format.print(new ScreensAnswer(Files.screened(site)), spec.commandLine().getOut());
        return Exit.OK;
    }
}
