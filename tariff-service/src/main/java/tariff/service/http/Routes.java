// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import static io.javalin.http.HandlerType.GET;
import static io.javalin.http.HandlerType.POST;

import java.util.List;
import tariff.service.shelf.Shelf;

/** Everything that is served, on one page. A new answer is a file that implements {@link Question} and a line here. */
public final class Routes {
    private Routes() {}

    public static List<Route> of(Shelf shelf) {
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
                new Route(POST, "/assessments", exchange.of(new Assessments(shelf))),
                new Route(POST, "/reports", exchange.of(Reports.TYPE, new Reports(shelf)::page)));
    }
}
