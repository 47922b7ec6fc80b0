// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import io.javalin.Javalin;
import io.javalin.config.JavalinConfig;
import java.util.List;
import org.eclipse.jetty.server.Connector;
import org.eclipse.jetty.server.Server;
import org.eclipse.jetty.server.ServerConnector;
import org.eclipse.jetty.util.component.LifeCycle;
import org.eclipse.jetty.util.thread.QueuedThreadPool;
import tariff.service.shelf.Shelf;

/** The service: built from a shelf of rates, and started on a port apart from that. */
public final class Service {
    public static final long MOST_UPLOAD_BYTES = 64_000_000;
    private static final int IDLE_MILLIS = 30_000;
    private static final int MOST_THREADS = 24;

    private final Javalin app;

    private Service(Javalin app) {
        this.app = app;
    }

    /**
     * Builds the service.
     *
     * @param stopMillis how long a request under way may take to finish once the service is stopped
     */
    public static Service build(Shelf shelf, long stopMillis) {
        return build(shelf, stopMillis, MOST_UPLOAD_BYTES);
    }

    /** The same with another limit of uploaded interval data, in bytes. */
    public static Service build(Shelf shelf, long stopMillis, long mostUploadBytes) {
        List<Route> routes = Routes.of(shelf, mostUploadBytes);
        return new Service(Javalin.create(config -> configure(config, routes, stopMillis)));
    }

    private static void configure(JavalinConfig config, List<Route> routes, long stopMillis) {
        config.startup.showJavalinBanner = false;
        config.startup.showOldJavalinVersionWarning = false;
        config.startup.startupWatcherEnabled = false;
        config.http.prefer405over404 = true;
        config.http.maxRequestSize = Body.MOST_BYTES;
        config.jetty.threadPool = new QueuedThreadPool(MOST_THREADS);
        config.jetty.modifyHttpConfiguration(http -> {
            http.setSendServerVersion(false);
            http.setIdleTimeout(IDLE_MILLIS);
        });
        config.jetty.modifyServer(server -> {
            server.setStopTimeout(stopMillis);
            server.setErrorHandler(new ProblemPages());
            server.addEventListener(new StalledHeaders(server));
        });
        config.routes.before(RequestId::set);
        routes.forEach(route -> config.routes.addHttpHandler(route.method(), route.path(), route.handler()));
        Problems.answerWith(config.routes);
        config.requestLogger.http(RequestId::log);
    }

    /** A stalled body times out by the HTTP configuration; a stalled header only by the connector, which exists once the server starts. */
    private record StalledHeaders(Server server) implements LifeCycle.Listener {
        @Override
        public void lifeCycleStarting(LifeCycle starting) {
            for (Connector connector : server.getConnectors()) {
                if (connector instanceof ServerConnector tcp) {
                    tcp.setIdleTimeout(IDLE_MILLIS);
                }
            }
        }
    }

    /** Starts it; port 0 takes any free one. */
    public Service start(int port) {
        app.start(port);
        return this;
    }

    /** The port it listens on. */
    public int port() {
        return app.port();
    }

    /** Stops taking requests and lets those under way finish. */
    public void stop() {
        app.stop();
    }
}
