// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import io.javalin.http.Context;
import java.util.Locale;
import java.util.UUID;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/** A name for each request, in its answer and in the log; the client's own if it sends a usable one. */
final class RequestId {
    static final String HEADER = "X-Request-Id";
    private static final String USABLE = "[A-Za-z0-9._-]{1,64}";
    private static final Logger LOG = LoggerFactory.getLogger(RequestId.class);

    private RequestId() {}

    static void set(Context ctx) {
        String given = ctx.header(HEADER);
        boolean usable = given != null && given.matches(USABLE);
        ctx.header(HEADER, usable ? given : UUID.randomUUID().toString());
    }

    static String of(Context ctx) {
        return String.valueOf(ctx.res().getHeader(HEADER));
    }

    static void log(Context ctx, float millis) {
        LOG.info(
                "{} {} {} {} {} ms",
                of(ctx),
                ctx.req().getMethod(),
                ctx.req().getRequestURI(),
                ctx.statusCode(),
                String.format(Locale.ROOT, "%.1f", millis));
    }
}
