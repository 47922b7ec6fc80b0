// SPDX-License-Identifier: Apache-2.0
package tariff.service.request;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import tariff.meter.Site;
import tariff.notice.Finding;
import tariff.notice.Refusal;
import tariff.payback.Investment;
import tariff.payback.Outlook;
import tariff.proposal.Proposal;
import tariff.rate.Rate;
import tariff.rate.clause.Nearest;
import tariff.rate.clause.Written;
import tariff.service.shelf.Shelf;

/** What is asked of interval data that come in a body of their own: the parameters of the query, read part by part. */
public final class IntervalRequest {
    private static final Set<String> CLAUSES = Set.of("kvar", "charts");
    private static final Set<String> BANK = Set.of(
            "fixedKvar",
            "stepsKvar",
            "targetPowerFactor",
            "switchingDelayMinutes",
            "operationsPerHour",
            "ratedVolts",
            "serviceVolts",
            "reactorShare",
            "wattsPerKvar",
            "off");
    private static final Set<String> INVESTMENT =
            Set.of("purchase", "installation", "incentives", "yearlyUpkeep", "lifeYears", "residual");
    private static final Set<String> OUTLOOK =
            Set.of("discountRate", "savingsEscalation", "upkeepEscalation", "savingsDegradation");

    private final Map<String, Object> query;
    private final List<Finding> findings = new ArrayList<>();
    private final Written written;

    /** @param parameters every value of each parameter of the query */
    public IntervalRequest(Map<String, List<String>> parameters) {
        this.query = new QueryValues(findings).of(parameters);
        this.written = new Written(query, "", findings::add);
    }

    /** The rate on the shelf whose id is {@code rate}. */
    public Optional<Rate> rate(Shelf shelf) {
        if (!written.has("rate")) {
            findings.add(Finding.error("missing-key", "", "\"rate\" is missing")
                    .allowed(Nearest.list(shelf.rates().keySet())));
            return Optional.empty();
        }
        return RateId.read(written.at("rate"), shelf);
    }

    /** What the contract says of the site: {@code site}, {@code option} and {@code agreed}. */
    public Site site() {
        return SiteParameters.read(written, findings);
    }

    /** How the data are to be read. */
    public IntervalTerms intervals() {
        return IntervalTerms.read(part(IntervalTerms.names()), findings);
    }

    /** The next few kvar, and whether charts are wanted. */
    public Optional<ClauseTerms> clauses() {
        return Declared.sound(ClauseTerms.read(part(CLAUSES)), "", findings);
    }

    /** Bank, price and outlook; empty if the bank cannot be read. */
    public Optional<Proposal> proposal() {
        Optional<BankTerms> bank = Declared.sound(BankTerms.read(part(BANK)), "", findings);
        Written price = part(INVESTMENT);
        Optional<Investment> investment = price.keys().isEmpty()
                ? Optional.empty()
                : Declared.sound(InvestmentTerms.read(price), "", findings).map(InvestmentTerms::investment);
        Outlook outlook = Declared.sound(OutlookTerms.read(part(OUTLOOK)), "", findings)
                .orElseGet(OutlookTerms::level)
                .outlook();
        return bank.map(terms -> new Proposal(terms.bank(), investment, outlook));
    }

    /** A part of the query as an object of its own; its parameters become known ones. */
    private Written part(Set<String> names) {
        names.forEach(written::has);
        Map<String, Object> part = new TreeMap<>(query);
        part.keySet().retainAll(names);
        return new Written(part, "", findings::add);
    }

    /**
     * Ends the reading; no other parameter may be left.
     *
     * @throws Refusal with everything that is wrong with the parts that were read
     */
    public void refuseIfWrong() {
        written.refuseOtherKeys();
        if (!findings.isEmpty()) {
            throw new Refusal(findings);
        }
    }
}
