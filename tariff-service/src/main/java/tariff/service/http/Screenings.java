// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import tariff.json.JsonObject;
import tariff.json.ScreeningsJson;
import tariff.proposal.BankCautions;
import tariff.proposal.Proposal;
import tariff.service.request.Request;

/** What could go wrong with this bank at this place? */
record Screenings() implements Question {

    @Override
    public JsonObject answer(@Nullable Object document) {
        Request request = new Request(document);
        Optional<Proposal> screened = request.screened();
        request.refuseIfWrong();
        return ScreeningsJson.write(
                screened.orElseThrow().screens(),
                BankCautions.of(screened.orElseThrow().bank()));
    }
}
