// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import tariff.bill.ByTheTotals;
import tariff.bill.Statement;
import tariff.notice.Assumption;

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
        List<Statement> statements = metered.billing().statements(metered.months());
        List<Assumption> more = new ArrayList<>(metered.assumptions());
        metered.sums()
                .flatMap(sums -> ByTheTotals.note(metered.billing(), statements))
                .ifPresent(more::add);
        format.print(
                new StatementAnswer(metered.rate(), statements, more),
                spec.commandLine().getOut());
        return Exit.OK;
    }
}
