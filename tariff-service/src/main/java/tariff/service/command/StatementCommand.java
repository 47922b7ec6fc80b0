// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import tariff.bill.Billing;
import tariff.meter.MeteredSite;
import tariff.rate.Rate;

/** Bills months under a rate. */
@Command(
        name = "statement",
        description = "Works out what a rate asks for each month, line by line and with its working.",
        mixinStandardHelpOptions = true)
@SuppressWarnings("NullAway.Init") // picocli fills them in
final class StatementCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Parameters(index = "0", paramLabel = "RATE", description = "the rate, a JSON file")
    private Path rate;

    @Parameters(index = "1", paramLabel = "BILLS", description = "the site and its months, a JSON file")
    private Path bills;

    @Option(names = "--format", description = "text, json or csv (${DEFAULT-VALUE} unless said)", defaultValue = "text")
    private Format format;

    @Override
    public Integer call() {
        Rate under = Files.rate(rate);
        MeteredSite site = Files.bills(bills);
        format.print(
                new StatementAnswer(under, new Billing(under, site.site()).statements(site.months())),
                spec.commandLine().getOut());
        return Exit.OK;
    }
}
