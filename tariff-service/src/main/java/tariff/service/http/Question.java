// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import org.jspecify.annotations.Nullable;
import tariff.json.JsonObject;
import tariff.notice.Refusal;

/** What a posted document asks. */
interface Question {

    /**
     * The answer.
     *
     * @param document maps, lists, texts, decimals, true and false
     * @throws Refusal with everything that is wrong with the document
     */
    JsonObject answer(@Nullable Object document);
}
