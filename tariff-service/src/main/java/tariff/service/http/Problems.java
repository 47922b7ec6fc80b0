// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import io.javalin.config.RoutesConfig;
import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.util.List;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import tariff.json.JsonObject;
import tariff.json.NoticeJson;
import tariff.notice.Finding;

/** The one place that writes problem responses: RFC 9457, {@code application/problem+json}. */
final class Problems {
    static final String TYPE = "application/problem+json";
    private static final Logger LOG = LoggerFactory.getLogger(Problems.class);
    private static final int MOST_FINDINGS = 100;
    private static final int SERVER_ERROR = 500;

    private Problems() {}

    static void answerWith(RoutesConfig routes) {
        routes.exception(Problem.class, (problem, ctx) -> write(ctx, problem));
        routes.exception(Exception.class, (failure, ctx) -> {
            LOG.error("request {} failed", RequestId.of(ctx), failure);
            write(ctx, new Problem(SERVER_ERROR, "The service failed; the fault is its own."));
        });
        routes.error(404, ctx -> plain(ctx, "Nothing is served here. GET / lists what is."));
        routes.error(
                405,
                ctx -> plain(
                        ctx,
                        "The method " + ctx.req().getMethod() + " is not served here; Allow lists those that are."));
        for (int status : List.of(400, 413, SERVER_ERROR, 503)) {
            routes.error(status, ctx -> plain(ctx, "The request cannot be served."));
        }
    }

    /** For a status that comes with no problem of ours; keeps the headers, such as Allow. */
    private static void plain(Context ctx, String detail) {
        if (!TYPE.equals(ctx.res().getContentType())) {
            write(ctx, new Problem(ctx.statusCode(), detail));
        }
    }

    private static void write(Context ctx, Problem problem) {
        ctx.status(problem.status());
        ctx.result(json(problem, ctx.req().getRequestURI()).bytes());
        ctx.contentType(TYPE);
    }

    static JsonObject json(Problem problem, String instance) {
        JsonObject json = new JsonObject()
                .with("type", "about:blank")
                .with("title", HttpStatus.forStatus(problem.status()).getMessage())
                .with("status", problem.status())
                .with("detail", problem.detail())
                .with("instance", instance);
        List<Finding> findings = problem.findings();
        if (findings.isEmpty()) {
            return json;
        }
        json.withAll("findings", findings.stream().limit(MOST_FINDINGS).toList(), NoticeJson::write);
        return findings.size() > MOST_FINDINGS ? json.with("findingsLeftOut", findings.size() - MOST_FINDINGS) : json;
    }
}
