// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import io.javalin.http.Context;
import io.javalin.http.Handler;
import java.util.List;
import java.util.concurrent.Semaphore;
import org.jspecify.annotations.Nullable;
import tariff.json.JsonObject;
import tariff.notice.Finding;
import tariff.notice.Refusal;

/** Read a document, ask, write the answer: what every question has in common. */
final class Exchange {
    static final String JSON = "application/json";

    private final Semaphore atOnce;

    /** An exchange that works out so many answers at once; other questions wait, so that they do not share too little memory. */
    Exchange(int atOnce) {
        this.atOnce = new Semaphore(atOnce, true);
    }

    Handler of(Question question) {
        return of(JSON, document -> question.answer(document).bytes());
    }

    /** The same for an answer of any media type. */
    Handler of(String type, Answer answer) {
        return ctx -> {
            Accepts.require(ctx, type);
            byte[] body = Body.read(ctx);
            atOnce.acquire();
            try {
                ctx.result(ask(answer, Body.document(body))).contentType(type);
            } finally {
                atOnce.release();
            }
        };
    }

    /** What a posted document is answered with, as it goes over the wire. */
    interface Answer {
        byte[] bytes(@Nullable Object document);
    }

    static void write(Context ctx, JsonObject answer) {
        ctx.result(answer.bytes()).contentType(JSON);
    }

    /** A document may still lead deeper than a thread can follow; that is said like any other finding. */
    private static byte[] ask(Answer answer, @Nullable Object document) {
        try {
            return answer.bytes(document);
        } catch (Refusal refusal) {
            throw new Problem(422, "The document cannot be used; see findings.", refusal.findings());
        } catch (StackOverflowError e) {
            throw new Problem(
                    422,
                    "The document cannot be used; see findings.",
                    List.of(Finding.error("too-large", "", "leads too deep to be worked out")));
        }
    }
}
