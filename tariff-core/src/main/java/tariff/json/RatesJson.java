// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import java.util.Map;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import tariff.rate.Rate;
import tariff.rate.RateDefinition;

/** Rates that are kept by id: the list of them, and one of them as it was written. */
public final class RatesJson {
    private RatesJson() {}

    /**
     * The list, with where each rate is found.
     *
     * @param rates by id, in the order of the list
     */
    public static JsonObject list(Map<String, Rate> rates) {
        return new JsonObject()
                .withAll(
                        "rates",
                        rates.entrySet(),
                        entry -> entry(entry.getKey(), entry.getValue().definition()));
    }

    private static JsonObject entry(String id, RateDefinition rate) {
        return new JsonObject()
                .with("id", id)
                .with("name", rate.name())
                .with("currency", rate.currency())
                .withIf("validFrom", rate.validFrom())
                .withIf("follows", rate.follows())
                .with("href", "/rates/" + id);
    }

    /**
     * A rate with what a check says of it.
     *
     * @param document the rate as {@link JsonTree} read it
     */
    public static JsonObject one(String id, @Nullable Object document) {
        JsonObject json = new JsonObject().with("id", id).put("document", Objects.requireNonNull(document));
        RateCheckJson.write(Rate.check(document)).entries().forEach(json::put);
        return json;
    }
}
