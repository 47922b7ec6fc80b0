// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.math.BigDecimal;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import tariff.proposal.ClauseEffects;
import tariff.proposal.ProposalCharts;
import tariff.service.request.ClauseTerms;
import tariff.service.request.Declared;

/** Says which clause bites. */
@Command(
        name = "clauses",
        description = {
            "Says what each clause costs because of reactive load, what the next 0.01 of power factor and the next few"
                    + " kvar would save, where the bill jumps next, and where savings end.",
            "A screening estimate, not a design."
        },
        mixinStandardHelpOptions = true)
@SuppressWarnings("NullAway.Init") // picocli fills them in
final class ClausesCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Mixin
    private MeterFile meter;

    @Option(
            names = "--kvar",
            paramLabel = "KVAR",
            description = "how many the next few kvar are, always on (${DEFAULT-VALUE} unless said)",
            defaultValue = "50")
    private BigDecimal kvar;

    @Mixin
    private ChartFiles charts;

    @Option(names = "--format", description = "text, json or csv (${DEFAULT-VALUE} unless said)", defaultValue = "text")
    private Format format;

    @Override
    public Integer call() {
        ClauseTerms terms = Declared.require(new ClauseTerms(kvar, false));
        Metered metered = meter.read(spec.commandLine().getErr());
        ClauseEffects effects = metered.sums()
                .map(sums -> ClauseEffects.of(metered.billing(), sums, terms.kvar()))
                .orElseGet(() -> ClauseEffects.of(metered.billing(), metered.months(), terms.kvar()));
        format.print(
                new ClauseEffectsAnswer(effects.with(metered.assumptions())),
                spec.commandLine().getOut());
        charts.write(
                () -> ProposalCharts.documents(effects.assessment(), metered.savingsBySize(), Optional.empty()),
                spec.commandLine().getErr());
        return Exit.OK;
    }
}
