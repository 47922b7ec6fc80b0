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
import tariff.bill.Billing;
import tariff.proposal.Assessment;
import tariff.proposal.Proposal;
import tariff.proposal.ProposalCharts;

/** Holds a bank against a year of bills. */
@Command(
        name = "assess",
        description = {
            "Says what low power factor costs today, what a capacitor bank would save, and when it pays back.",
            "A screening estimate, not a design."
        },
        mixinStandardHelpOptions = true)
@SuppressWarnings("NullAway.Init") // picocli fills them in
final class AssessCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Mixin
    private MeterFile meter;

    @Mixin
    private BankOptions bank;

    @Mixin
    private ChartFiles charts;

    @Option(names = "--format", description = "text, json or csv (${DEFAULT-VALUE} unless said)", defaultValue = "text")
    private Format format;

    @Override
    public Integer call() {
        Proposal proposal = bank.proposal();
        Metered metered = meter.read(spec.commandLine().getErr());
        Billing billing = metered.billing();
        Assessment assessment = metered.sums()
                .map(sums -> Assessment.of(billing, sums, proposal))
                .orElseGet(() -> Assessment.of(billing, metered.months(), proposal));
        format.print(
                new AssessmentAnswer(assessment.with(metered.assumptions())),
                spec.commandLine().getOut());
        Optional<BigDecimal> proposed = Optional.of(proposal.bank().ratedKvar());
        charts.write(
                () -> ProposalCharts.documents(assessment, metered.savingsBySize(), proposed),
                spec.commandLine().getErr());
        return Exit.OK;
    }
}
