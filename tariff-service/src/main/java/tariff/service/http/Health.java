// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import io.javalin.http.Context;
import io.javalin.http.Handler;
import tariff.json.JsonObject;
import tariff.service.shelf.Shelf;

/** Whether the service answers, and how many rates it keeps. */
record Health(Shelf shelf) implements Handler {

    @Override
    public void handle(Context ctx) {
        Accepts.require(ctx, Exchange.JSON);
        Exchange.write(
                ctx,
                new JsonObject()
                        .with("status", "up")
                        .with("rates", shelf.rates().size()));
    }
}
