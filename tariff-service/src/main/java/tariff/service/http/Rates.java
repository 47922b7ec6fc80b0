// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import io.javalin.http.Context;
import tariff.json.RatesJson;
import tariff.service.shelf.Shelf;

/** The rates on the shelf. */
record Rates(Shelf shelf) {

    void list(Context ctx) {
        Accepts.require(ctx, Exchange.JSON);
        Exchange.write(ctx, RatesJson.list(shelf.rates()));
    }

    void one(Context ctx) {
        Accepts.require(ctx, Exchange.JSON);
        String id = ctx.pathParam("id");
        Object document = shelf.document(id)
                .orElseThrow(() -> new Problem(404, "There is no rate with this id; GET /rates lists them."));
        Exchange.write(ctx, RatesJson.one(id, document));
    }
}
