// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import org.jspecify.annotations.Nullable;
import tariff.bill.Billing;
import tariff.json.ClauseEffectsJson;
import tariff.json.JsonObject;
import tariff.meter.MeteredMonth;
import tariff.meter.MeteredSite;
import tariff.proposal.ClauseEffects;
import tariff.proposal.ProposalCharts;
import tariff.proposal.SavingsBySize;
import tariff.rate.Rate;
import tariff.service.request.ClauseTerms;
import tariff.service.request.Request;
import tariff.service.shelf.Shelf;

/** Which clause bites, and what would the next point or the next few kvar save? */
record Clauses(Shelf shelf) implements Question {

    @Override
    public JsonObject answer(@Nullable Object document) {
        Request request = new Request(document);
        Optional<Rate> rate = request.rate(shelf);
        Optional<MeteredSite> bills = request.bills();
        Optional<ClauseTerms> terms = request.clauses();
        request.refuseIfWrong();
        Billing billing = new Billing(rate.orElseThrow(), bills.orElseThrow().site());
        List<MeteredMonth> months = bills.orElseThrow().months();
        ClauseEffects effects =
                ClauseEffects.of(billing, months, terms.orElseThrow().kvar());
        return write(effects, terms.orElseThrow(), () -> SavingsBySize.of(billing, months, SavingsBySize.USUAL_STEPS));
    }

    /** The answer with its charts, if they are wanted; only then is it asked what other sizes save. */
    static JsonObject write(ClauseEffects effects, ClauseTerms terms, Supplier<SavingsBySize> sizes) {
        JsonObject json = ClauseEffectsJson.write(effects);
        if (!terms.charts()) {
            return json;
        }
        JsonObject charts = new JsonObject();
        ProposalCharts.documents(effects.assessment(), sizes.get(), Optional.empty())
                .forEach(charts::with);
        return json.with("charts", charts);
    }
}
