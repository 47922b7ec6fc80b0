// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import tariff.bill.Billing;
import tariff.proposal.Sizing;
import tariff.proposal.SizingTerms;
import tariff.service.request.SizeTerms;

/** Finds the best bank for a year of bills, or says that none is. */
@Command(
        name = "size",
        description = {
            "Finds the capacitor bank that is worth most under a rate, or says that no bank is.",
            "A screening estimate, not a design."
        },
        mixinStandardHelpOptions = true)
@SuppressWarnings("NullAway.Init") // picocli fills them in
final class SizeCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Mixin
    private MeterFile meter;

    @Mixin
    private SizeOptions options;

    @Option(names = "--format", description = "text, json or csv (${DEFAULT-VALUE} unless said)", defaultValue = "text")
    private Format format;

    @Override
    public Integer call() {
        SizeTerms asked = options.terms();
        Metered metered = meter.read(spec.commandLine().getErr());
        Billing billing = metered.billing();
        SizingTerms terms = asked.on(metered.months());
        Sizing sizing = metered.sums()
                .map(sums -> Sizing.of(billing, sums, terms))
                .orElseGet(() -> Sizing.of(billing, metered.months(), terms));
        format.print(
                new SizingAnswer(billing, asked.basis(), sizing.with(metered.assumptions())),
                spec.commandLine().getOut());
        return Exit.OK;
    }
}
