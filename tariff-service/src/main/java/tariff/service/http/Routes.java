// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import static io.javalin.http.HandlerType.GET;
import static io.javalin.http.HandlerType.POST;

import java.util.List;
import tariff.service.shelf.Shelf;

/** Everything that is served, on one page. A new answer is a file that implements {@link Question} and a line here. */
public final class Routes {
    private Routes() {}

    /** The route table over a shelf; uploaded interval data may be so many bytes long. */
    public static List<Route> of(Shelf shelf, long mostUploadBytes) {
        Intervals intervals = new Intervals(shelf);
        Uploads uploads = new Uploads(mostUploadBytes);
        Rates rates = new Rates(shelf);
        Exchange exchange = new Exchange(Math.max(2, Runtime.getRuntime().availableProcessors()));
        return List.of(
                new Route(GET, "/", Document.of("text/html", "/page/index.html")),
                new Route(GET, "/openapi.json", Document.of("application/json", "/openapi/openapi.json")),
                new Route(
                        GET, "/schemas/rate.json", Document.of("application/schema+json", "/openapi/rate.schema.json")),
                new Route(GET, "/health", new Health(shelf)),
                new Route(GET, "/rates", rates::list),
                new Route(GET, "/rates/{id}", rates::one),
                new Route(POST, "/rate-checks", exchange.of(new RateChecks())),
                new Route(POST, "/statements", exchange.of(new Statements(shelf))),
                new Route(POST, "/reconciliations", exchange.of(new Reconciliations(shelf))),
                new Route(POST, "/clause-effects", exchange.of(new Clauses(shelf))),
                new Route(POST, "/assessments", exchange.of(new Assessments(shelf))),
                new Route(POST, "/sizings", exchange.of(new Sizings(shelf))),
                new Route(POST, "/reviews", exchange.of(new Reviews(shelf))),
                new Route(POST, "/screenings", exchange.of(new Screenings())),
                new Route(POST, "/reports", exchange.of(Reports.TYPE, new Reports(shelf)::page)),
                new Route(POST, "/interval-statements", uploads.of(intervals::statements)),
                new Route(POST, "/interval-assessments", uploads.of(intervals::assessment)),
                new Route(POST, "/interval-clause-effects", uploads.of(intervals::clauseEffects)));
    }
}
