// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import tariff.reconcile.Reconciliation;

/** Holds bills that were paid against a rate. */
@Command(
        name = "reconcile",
        description = {
            "Says whether the bills that were paid agree with the rate, line by line, and what would make them agree.",
            "What it finds may be so; that it is so, only the utility can say."
        },
        mixinStandardHelpOptions = true)
@SuppressWarnings("NullAway.Init") // picocli fills them in
final class ReconcileCommand implements Callable<Integer> {
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
                new ReconciliationAnswer(metered.billing(), Reconciliation.of(metered.billing(), metered.months())),
                spec.commandLine().getOut());
        return Exit.OK;
    }
}
