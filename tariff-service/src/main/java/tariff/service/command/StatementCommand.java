// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** Bills months under a rate. */
@Command(
        name = "statement",
        description = "Works out what a rate asks for each month, line by line and with its working.",
        mixinStandardHelpOptions = true)
@SuppressWarnings("NullAway.Init") // picocli fills them in
final class StatementCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Mixin
    private MeterFile meter;

    @Option(names = "--format", description = "text, json or csv (${DEFAULT-VALUE} unless said)", defaultValue = "text")
    private Format format;

    @Override
    public Integer call() {
        Metered metered = meter.read(spec.commandLine().getErr());
        format.print(
                new StatementAnswer(metered.rate(), metered.billing().statements(metered.months())),
                spec.commandLine().getOut());
        return Exit.OK;
    }
}
