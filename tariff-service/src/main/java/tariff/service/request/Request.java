// SPDX-License-Identifier: Apache-2.0
package tariff.service.request;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import tariff.correction.Estimate;
import tariff.electrical.BankAtSite;
import tariff.electrical.KwhShare;
import tariff.json.BillsJson;
import tariff.json.PeriodJson;
import tariff.meter.MeteredSite;
import tariff.notice.Finding;
import tariff.notice.Refusal;
import tariff.proposal.Claim;
import tariff.proposal.Offer;
import tariff.proposal.Proposal;
import tariff.rate.Rate;
import tariff.rate.clause.Written;
import tariff.service.shelf.Shelf;

/** A question being read: its parts one after the other, and at the end everything that is wrong with any of them. */
public final class Request {
    private static final Map<String, KwhShare.Place> PLACES = new TreeMap<>(Map.of(
            "at the meter", KwhShare.Place.AT_THE_METER,
            "behind own transformer", KwhShare.Place.BEHIND_OWN_TRANSFORMER,
            "at the load", KwhShare.Place.AT_THE_LOAD));
    private static final Map<String, Estimate> ESTIMATES =
            new TreeMap<>(Map.of("low", Estimate.LOW, "central", Estimate.CENTRAL, "high", Estimate.HIGH));

    private final @Nullable Object document;
    private final List<Finding> findings = new ArrayList<>();
    private final Written written;

    /** @param document maps, lists, texts, decimals, true and false, as a JSON document holds them */
    public Request(@Nullable Object document) {
        this.document = document;
        this.written = new Written(document, "", findings::add);
        if (!written.isObject()) {
            written.wrong("type", "must be an object", "an object in braces");
            refuseIfWrong();
        }
    }

    /** The rate under {@code "rate"}: an id on the shelf, or the rate itself. */
    public Optional<Rate> rate(Shelf shelf) {
        Written in = written.at("rate");
        if (!in.isText()) {
            return inline();
        }
        return RateId.read(in, shelf);
    }

    private Optional<Rate> inline() {
        if (!(document instanceof Map<?, ?> map) || !map.containsKey("rate")) {
            findings.add(Finding.error("missing-key", "", "\"rate\" is missing")
                    .allowed("the id of a rate in quotes, or a rate"));
            return Optional.empty();
        }
        Rate.Checked checked = Rate.check(map.get("rate"));
        checked.findings().stream()
                .filter(Finding::isError)
                .map(finding -> finding.inside("/rate"))
                .forEach(findings::add);
        return checked.rate();
    }

    /** The bills under {@code "site"} and {@code "months"}. */
    public Optional<MeteredSite> bills() {
        return BillsJson.read(written, findings);
    }

    /** The bank under {@code "bank"}. */
    private Optional<BankTerms> bank() {
        if (!written.has("bank")) {
            findings.add(Finding.error("missing-key", "", "\"bank\" is missing")
                    .allowed("an object with \"fixedKvar\", \"stepsKvar\" or both"));
            return Optional.empty();
        }
        return Declared.sound(BankTerms.read(written.at("bank")), "/bank", findings);
    }

    /** What the bank costs, under {@code "investment"}; empty if nothing is said of it. */
    private Optional<InvestmentTerms> investment() {
        return written.has("investment")
                ? Declared.sound(InvestmentTerms.read(written.at("investment")), "/investment", findings)
                : Optional.empty();
    }

    /** What is expected of the years ahead, under {@code "outlook"}. */
    private OutlookTerms outlook() {
        return written.has("outlook")
                ? Declared.sound(OutlookTerms.read(written.at("outlook")), "/outlook", findings)
                        .orElseGet(OutlookTerms::level)
                : OutlookTerms.level();
    }

    /** What is known of the bank's place, under {@code "network"}; empty if nothing is, or if it cannot be read. */
    private Optional<NetworkTerms> network() {
        if (!written.has("network")) {
            return Optional.empty();
        }
        int before = findings.size();
        NetworkTerms network = NetworkTerms.read(written.at("network"));
        return findings.size() == before ? Optional.of(network) : Optional.empty();
    }

    private Optional<BankAtSite> atSite(Optional<BankTerms> bank, Optional<NetworkTerms> network) {
        return bank.flatMap(terms -> network.map(place -> new ScreenedBank(terms, place)))
                .filter(screened -> screened.check(findings::add))
                .map(ScreenedBank::atSite);
    }

    /** Bank, investment, outlook and network together; empty if the bank cannot be read. */
    public Optional<Proposal> proposal() {
        return proposal(bank(), network());
    }

    private Optional<Proposal> proposal(Optional<BankTerms> bank, Optional<NetworkTerms> network) {
        Optional<InvestmentTerms> investment = investment();
        OutlookTerms outlook = outlook();
        Optional<BankAtSite> atSite = atSite(bank, network);
        return bank.map(terms ->
                new Proposal(terms.bank(), investment.map(InvestmentTerms::investment), outlook.outlook(), atSite));
    }

    /** A proposal with its promises, under {@code "claims"}, and its {@code "place"}; empty if the bank cannot be read. */
    public Optional<Offer> offer() {
        Optional<NetworkTerms> network = network();
        Optional<Proposal> proposal = proposal(bank(), network);
        Optional<KwhShare.Place> place = written.has("place")
                ? Optional.of(written.word("place", PLACES, KwhShare.Place.AT_THE_LOAD))
                : Optional.empty();
        List<Claim> claims = written.list("claims").stream()
                .map(ClaimKind::read)
                .flatMap(Optional::stream)
                .toList();
        return proposal.map(offered -> new Offer(
                offered,
                place,
                network.flatMap(NetworkTerms::nonLinearShare),
                network.flatMap(NetworkTerms::currentThd),
                claims));
    }

    /** Whether the document holds promises to review. */
    public boolean claims() {
        return written.has("claims");
    }

    /** The bank and its network, which must be there; empty if one of the two cannot be read. */
    public Optional<Proposal> screened() {
        if (!written.has("network")) {
            findings.add(Finding.error("missing-key", "", "\"network\" is missing")
                    .allowed("an object with \"serviceVolts\" and what else is known"));
        }
        Optional<BankTerms> bank = bank();
        Optional<BankAtSite> atSite = atSite(bank, network());
        return bank.map(terms -> new Proposal(
                terms.bank(), Optional.empty(), OutlookTerms.level().outlook(), atSite));
    }

    /** The same of a document that may also be an offer: its other parts are read too. */
    public Optional<Proposal> screenedOffer() {
        if (!written.has("network")) {
            return screened();
        }
        return written.has("claims") ? offer().map(Offer::proposal) : proposal();
    }

    /** A document that is a list of prices. */
    public Optional<PriceTerms> prices() {
        return Declared.sound(PriceTerms.read(written), "", findings);
    }

    /** Under {@code "prices"}, {@code "outlook"}, {@code "choice"} and {@code "basis"}: what a sizing is asked with. */
    public Optional<SizeTerms> sizing() {
        int before = findings.size();
        if (!written.has("prices")) {
            findings.add(Finding.error("missing-key", "", "\"prices\" is missing")
                    .allowed("an object with \"perKvar\": there are no prices but your own"));
        }
        Optional<PriceTerms> prices = written.has("prices")
                ? Declared.sound(PriceTerms.read(written.at("prices")), "/prices", findings)
                : Optional.empty();
        ChoiceTerms choice = written.has("choice")
                ? Declared.sound(ChoiceTerms.read(written.at("choice")), "/choice", findings)
                        .orElseGet(ChoiceTerms::usual)
                : ChoiceTerms.usual();
        findings.addAll(Declared.check(choice.make(), "/choice/make"));
        OutlookTerms outlook = outlook();
        if (!(written.has("outlook") && written.at("outlook").has("discountRate"))) {
            findings.add(Finding.error("missing-key", "/outlook", "\"discountRate\" is missing")
                    .allowed("0 to 1, where 0.08 means 8 %: the best size is the one worth most today"));
        }
        Estimate basis = written.word("basis", ESTIMATES, Estimate.CENTRAL);
        return findings.size() == before
                ? prices.map(each -> new SizeTerms(choice, each, outlook, basis))
                : Optional.empty();
    }

    /** The next few kvar under {@code "kvar"}, and whether {@code "charts"} are wanted. */
    public Optional<ClauseTerms> clauses() {
        return Declared.sound(ClauseTerms.read(written), "", findings);
    }

    /** The day under {@code "date"}, if there is one. */
    public Optional<LocalDate> date() {
        return PeriodJson.day(written, "date");
    }

    /**
     * Ends the reading; no other key may be left.
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
