// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import org.jspecify.annotations.Nullable;
import tariff.json.JsonObject;
import tariff.json.RateCheckJson;
import tariff.rate.Rate;

/** Is this a rate that can be used, and what does it say? A wrong rate is an answer here, not a problem. */
final class RateChecks implements Question {

    @Override
    public JsonObject answer(@Nullable Object document) {
        return RateCheckJson.write(Rate.check(document));
    }
}
