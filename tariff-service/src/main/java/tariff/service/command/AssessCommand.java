// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.math.BigDecimal;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import tariff.meter.MonthlySums;
import tariff.notice.Finding;
import tariff.notice.Refusal;
import tariff.proposal.Assessment;
import tariff.proposal.DurationOfDemand;
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

    @Option(
            names = "--duration-chart",
            paramLabel = "FILE",
            description =
                    "with --intervals: the reactive demand as a duration curve with the bank drawn in, an SVG file")
    private Optional<Path> durationChart;

    @Override
    public Integer call() {
        Proposal proposal = bank.proposal();
        Metered metered = meter.read(spec.commandLine().getErr());
        Assessment assessment = metered.assessment(proposal);
        durationChart.ifPresent(file -> Files.write(file, curve(metered, proposal)));
        format.print(new AssessmentAnswer(assessment), spec.commandLine().getOut());
        Optional<BigDecimal> proposed = Optional.of(proposal.bank().ratedKvar());
        charts.write(
                () -> ProposalCharts.documents(assessment, metered.savingsBySize(), proposed),
                spec.commandLine().getErr());
        return Exit.OK;
    }

    private static String curve(Metered metered, Proposal proposal) {
        MonthlySums sums = metered.sums()
                .orElseThrow(() -> new Refusal(
                        Finding.error("no-intervals", "--duration-chart", "can be drawn from interval data only")
                                .allowed("--intervals FILE")));
        return DurationOfDemand.chart(metered.rate().name(), sums.series(), proposal.bank())
                .svg();
    }
}
