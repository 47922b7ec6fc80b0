// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import io.javalin.http.Context;
import io.javalin.http.Handler;
import java.io.IOException;
import java.util.Locale;
import java.util.Set;
import java.util.concurrent.Semaphore;
import tariff.intervalfile.IntervalFile;
import tariff.intervalfile.IntervalFileOptions;
import tariff.intervalfile.IntervalReading;
import tariff.json.JsonObject;
import tariff.notice.Refusal;
import tariff.service.request.IntervalRequest;

/**
 * Interval data as they are uploaded: read row by row from the connection, so that neither a file nor the text is kept. Few are read at
 * once; who comes while all places are taken is told so at once, and holds no thread.
 */
final class Uploads {
    static final Set<String> TYPES = Set.of("text/csv", "application/atom+xml", "application/xml");
    static final int AT_ONCE = 2;
    private static final String RETRY_SECONDS = "5";

    private final long mostBytes;
    private final Semaphore places = new Semaphore(AT_ONCE);

    /** What is asked of uploaded data. */
    interface Question {
        /** Reads the query, takes the data, answers. */
        JsonObject answer(IntervalRequest request, Data data);
    }

    /** Data that have not been read yet. */
    interface Data {
        IntervalReading read(IntervalFileOptions options);
    }

    Uploads(long mostBytes) {
        this.mostBytes = mostBytes;
    }

    Handler of(Question question) {
        return ctx -> {
            Accepts.require(ctx, Exchange.JSON);
            requireType(ctx);
            if (ctx.req().getContentLengthLong() > mostBytes) {
                throw tooLong();
            }
            if (!places.tryAcquire()) {
                ctx.header("Retry-After", RETRY_SECONDS);
                throw new Problem(503, "As many uploads as the service takes at once are being read; try again.");
            }
            try {
                Exchange.write(
                        ctx, question.answer(new IntervalRequest(ctx.queryParamMap()), options -> read(ctx, options)));
            } catch (Refusal refusal) {
                throw new Problem(422, "The interval data cannot be used; see findings.", refusal.findings());
            } finally {
                places.release();
            }
        };
    }

    private static void requireType(Context ctx) {
        String type = ctx.req().getContentType();
        if (type == null || !TYPES.contains(type.split(";", 2)[0].strip().toLowerCase(Locale.ROOT))) {
            throw new Problem(
                    415,
                    "The body must be text/csv, or application/atom+xml for a feed of NAESB REQ.21"
                            + (type == null ? "; the request says no type." : "."));
        }
    }

    private IntervalReading read(Context ctx, IntervalFileOptions options) {
        try {
            return IntervalFile.read(new LimitedStream(ctx.bodyInputStream(), mostBytes), options);
        } catch (LimitedStream.TooLong tooLong) {
            throw tooLong();
        } catch (IOException broken) {
            throw new Problem(400, "The body broke off before its end.");
        }
    }

    private Problem tooLong() {
        return new Problem(
                413,
                "The interval data are larger than " + mostBytes
                        + " bytes; send fewer months, or raise the limit where the service is started.");
    }
}
