// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import tariff.notice.Finding;
import tariff.notice.Refusal;
import tariff.proposal.Offer;

/** Holds what an offer promises against the rate, the bills and physics. */
@Command(
        name = "review",
        description = {
            "Says claim by claim whether an offer of a capacitor bank holds.",
            "A screening estimate, not a design."
        },
        mixinStandardHelpOptions = true)
@SuppressWarnings("NullAway.Init") // picocli fills them in
final class ReviewCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Mixin
    private MeterFile meter;

    @Parameters(
            index = "2",
            arity = "0..1",
            paramLabel = "OFFER",
            description = "bank, price and claims, a JSON file; with \"network\" the bank is screened too")
    private Optional<Path> offer;

    @Option(names = "--offer", paramLabel = "OFFER", description = "the same, where interval data stand in for BILLS")
    private Optional<Path> named;

    @Option(names = "--format", description = "text, json or csv (${DEFAULT-VALUE} unless said)", defaultValue = "text")
    private Format format;

    @Override
    public Integer call() {
        if (offer.isPresent() == named.isPresent()) {
            throw new Refusal(Finding.error("no-offer", "", "give either OFFER or --offer"));
        }
        Offer made = Files.offer(offer.or(() -> named).orElseThrow());
        Metered metered = meter.read(spec.commandLine().getErr());
        format.print(new ReviewAnswer(metered.review(made)), spec.commandLine().getOut());
        return Exit.OK;
    }
}
