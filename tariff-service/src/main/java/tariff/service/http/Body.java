// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import io.javalin.http.Context;
import java.io.IOException;
import java.util.Locale;
import org.jspecify.annotations.Nullable;
import tariff.json.JsonTree;
import tariff.notice.Refusal;

/** The posted document: JSON, and not too much of it. */
final class Body {
    static final int MOST_BYTES = 1_000_000;

    private Body() {}

    static byte[] read(Context ctx) throws IOException {
        String type = ctx.req().getContentType();
        if (type == null
                || !type.split(";", 2)[0].strip().toLowerCase(Locale.ROOT).equals(Exchange.JSON)) {
            throw new Problem(
                    415, "The body must be application/json" + (type == null ? "; the request says no type." : "."));
        }
        byte[] body = ctx.bodyInputStream().readNBytes(MOST_BYTES + 1);
        if (body.length > MOST_BYTES) {
            throw new Problem(413, "The body is larger than " + MOST_BYTES + " bytes.");
        }
        return body;
    }

    static @Nullable Object document(byte[] body) {
        try {
            return JsonTree.read(body);
        } catch (Refusal refusal) {
            throw new Problem(
                    400, "The body is not a JSON document that can be read; see findings.", refusal.findings());
        }
    }
}
