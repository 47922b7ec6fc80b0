// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.math.BigDecimal;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import picocli.CommandLine.Option;
import tariff.proposal.Proposal;
import tariff.service.request.BankTerms;
import tariff.service.request.Declared;
import tariff.service.request.InvestmentTerms;
import tariff.service.request.OffHours;
import tariff.service.request.OutlookTerms;

/** The bank that a command is asked about: from a file, or from options. */
@SuppressWarnings("NullAway.Init") // picocli fills them in
final class BankOptions {
    @Option(
            names = "--proposal",
            paramLabel = "FILE",
            description = "bank, investment and outlook, a JSON file; the other options of the bank are then not used")
    private Optional<Path> file;

    @Option(names = "--fixed", paramLabel = "KVAR", description = "kvar that are always on", defaultValue = "0")
    private BigDecimal fixedKvar;

    @Option(names = "--steps", paramLabel = "KVAR", split = ",", description = "kvar of each switched step: 50,50,100")
    private List<BigDecimal> stepsKvar = List.of();

    @Option(
            names = "--target",
            paramLabel = "PF",
            description = "power factor that the steps aim at; unity unless said")
    private Optional<BigDecimal> target;

    @Option(
            names = "--delay",
            paramLabel = "MINUTES",
            description =
                    "how long switching must be wanted before a step is switched; less than an interval counts as quick")
    private Optional<Integer> delayMinutes;

    @Option(
            names = "--operations-per-hour",
            paramLabel = "N",
            description = "steps switched in or out in any hour, at most; no limit unless said")
    private Optional<Integer> operationsPerHour;

    @Option(
            names = "--off",
            paramLabel = "TIMES",
            description = "when a time switch keeps the whole bank off, every day: 22:00-06:00")
    private Optional<String> off;

    @Option(names = "--cost", paramLabel = "MONEY", description = "what the bank costs until it is in service")
    private Optional<BigDecimal> cost;

    @Option(names = "--upkeep", paramLabel = "MONEY", description = "upkeep a year", defaultValue = "0")
    private BigDecimal upkeep;

    @Option(names = "--life", paramLabel = "YEARS", description = "${DEFAULT-VALUE} unless said", defaultValue = "15")
    private int lifeYears;

    @Option(names = "--discount", paramLabel = "SHARE", description = "discount rate a year: 0.08")
    private Optional<BigDecimal> discountRate;

    Proposal proposal() {
        if (file.isPresent()) {
            return Files.proposal(file.get());
        }
        BankTerms bank = Declared.require(BankTerms.plain(fixedKvar, stepsKvar)
                .told(target, delayMinutes, operationsPerHour, off.map(times -> OffHours.daily("--off", times))));
        Optional<InvestmentTerms> investment =
                cost.map(money -> Declared.require(InvestmentTerms.plain(money, upkeep, lifeYears)));
        OutlookTerms outlook = Declared.require(OutlookTerms.level(discountRate));
        return new Proposal(bank.bank(), investment.map(InvestmentTerms::investment), outlook.outlook());
    }
}
