// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import tariff.bill.Billing;
import tariff.meter.MeteredSite;
import tariff.proposal.Assessment;
import tariff.proposal.Proposal;
import tariff.rate.Rate;
import tariff.service.request.BankTerms;
import tariff.service.request.Declared;
import tariff.service.request.InvestmentTerms;
import tariff.service.request.OutlookTerms;

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
    private RateAndBills given;

    @Option(names = "--fixed", paramLabel = "KVAR", description = "kvar that are always on", defaultValue = "0")
    private BigDecimal fixedKvar;

    @Option(names = "--steps", paramLabel = "KVAR", split = ",", description = "kvar of each switched step: 50,50,100")
    private List<BigDecimal> stepsKvar = List.of();

    @Option(names = "--cost", paramLabel = "MONEY", description = "what the bank costs until it is in service")
    private Optional<BigDecimal> cost;

    @Option(names = "--upkeep", paramLabel = "MONEY", description = "upkeep a year", defaultValue = "0")
    private BigDecimal upkeep;

    @Option(names = "--life", paramLabel = "YEARS", description = "${DEFAULT-VALUE} unless said", defaultValue = "15")
    private int lifeYears;

    @Option(names = "--discount", paramLabel = "SHARE", description = "discount rate a year: 0.08")
    private Optional<BigDecimal> discountRate;

    @Option(names = "--format", description = "text, json or csv (${DEFAULT-VALUE} unless said)", defaultValue = "text")
    private Format format;

    @Override
    public Integer call() {
        BankTerms bank = Declared.require(BankTerms.plain(fixedKvar, stepsKvar));
        Optional<InvestmentTerms> investment =
                cost.map(money -> Declared.require(InvestmentTerms.plain(money, upkeep, lifeYears)));
        OutlookTerms outlook = Declared.require(OutlookTerms.level(discountRate));
        Rate under = given.rate();
        MeteredSite site = given.bills(under, spec.commandLine().getErr());
        Billing billing = new Billing(under, site.site());
        Proposal proposal = new Proposal(bank.bank(), investment.map(InvestmentTerms::investment), outlook.outlook());
        format.print(
                new AssessmentAnswer(Assessment.of(billing, site.months(), proposal)),
                spec.commandLine().getOut());
        return Exit.OK;
    }
}
