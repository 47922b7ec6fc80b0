// SPDX-License-Identifier: Apache-2.0
package tariff.service.request;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import tariff.json.BillsJson;
import tariff.json.PeriodJson;
import tariff.meter.MeteredSite;
import tariff.notice.Finding;
import tariff.notice.Refusal;
import tariff.proposal.Proposal;
import tariff.rate.Rate;
import tariff.rate.clause.Nearest;
import tariff.rate.clause.Written;
import tariff.service.shelf.Shelf;

/** A question being read: its parts one after the other, and at the end everything that is wrong with any of them. */
public final class Request {
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
        Optional<Rate> rate = shelf.rate(in.text());
        if (rate.isEmpty()) {
            in.wrong(
                    "unknown-rate",
                    "is not the id of a rate"
                            + Nearest.hint(in.text(), shelf.rates().keySet()),
                    Nearest.list(shelf.rates().keySet()));
        }
        return rate;
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
        return declared(BankTerms.read(written.at("bank")), "/bank");
    }

    /** What the bank costs, under {@code "investment"}; empty if nothing is said of it. */
    private Optional<InvestmentTerms> investment() {
        return written.has("investment")
                ? declared(InvestmentTerms.read(written.at("investment")), "/investment")
                : Optional.empty();
    }

    /** What is expected of the years ahead, under {@code "outlook"}. */
    private OutlookTerms outlook() {
        return written.has("outlook")
                ? declared(OutlookTerms.read(written.at("outlook")), "/outlook").orElseGet(OutlookTerms::level)
                : OutlookTerms.level();
    }

    /** Bank, investment and outlook together; empty if the bank or what it costs cannot be read. */
    public Optional<Proposal> proposal() {
        Optional<BankTerms> bank = bank();
        Optional<InvestmentTerms> investment = investment();
        OutlookTerms outlook = outlook();
        return bank.map(
                terms -> new Proposal(terms.bank(), investment.map(InvestmentTerms::investment), outlook.outlook()));
    }

    /** The day under {@code "date"}, if there is one. */
    public Optional<LocalDate> date() {
        return PeriodJson.day(written, "date");
    }

    private <T> Optional<T> declared(T terms, String pointer) {
        List<Finding> found = Declared.check(terms, pointer);
        findings.addAll(found);
        return found.isEmpty() ? Optional.of(terms) : Optional.empty();
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
