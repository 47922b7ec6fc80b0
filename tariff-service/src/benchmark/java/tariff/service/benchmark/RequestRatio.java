// SPDX-License-Identifier: Apache-2.0
package tariff.service.benchmark;

import io.javalin.Javalin;
import java.io.IOException;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.atomic.AtomicLong;
import tariff.service.http.Service;
import tariff.service.shelf.Shelf;

/**
 * How many assessments a second, against a bare echo of the same body in the same process? The two are asked in turn, so that a machine
 * whose speed drifts disturbs both alike; the median of the pairs is told.
 */
public final class RequestRatio {
    private static final int CLIENTS = 4;
    private static final int ROUNDS = 9;
    private static final long ROUND_NANOS = 2_000_000_000L;

    private RequestRatio() {}

    public static void main(String[] args) throws IOException, InterruptedException {
        Path root = Path.of("");
        byte[] body = Files.readAllBytes(root.resolve("examples/requests/assessment.json"));
        Service service =
                Service.build(Shelf.read(root.resolve("examples/rates")), 0).start(0);
        Javalin echo = Javalin.create(config -> {
                    config.startup.showJavalinBanner = false;
                    config.routes.post("/echo", context -> context.result(context.bodyAsBytes()));
                })
                .start(0);
        URI assessments = URI.create("http://127.0.0.1:" + service.port() + "/assessments");
        URI echoes = URI.create("http://127.0.0.1:" + echo.port() + "/echo");
        double[] ratios = new double[ROUNDS];
        for (int round = -2; round < ROUNDS; round++) {
            double ours = perSecond(assessments, body);
            double bare = perSecond(echoes, body);
            System.out.printf(Locale.ROOT, "assessments %.0f/s, echoes %.0f/s, ratio %.2f%n", ours, bare, ours / bare);
            if (round >= 0) {
                ratios[round] = ours / bare;
            }
        }
        Arrays.sort(ratios);
        System.out.printf(Locale.ROOT, "median ratio %.2f (at least 0.5)%n", ratios[ROUNDS / 2]);
        echo.stop();
        service.stop();
    }

    private static double perSecond(URI uri, byte[] body) throws InterruptedException {
        AtomicLong answered = new AtomicLong();
        CountDownLatch done = new CountDownLatch(CLIENTS);
        long end = System.nanoTime() + ROUND_NANOS;
        List<Thread> threads = new ArrayList<>();
        for (int i = 0; i < CLIENTS; i++) {
            threads.add(new Thread(() -> {
                HttpClient client = HttpClient.newHttpClient();
                HttpRequest request = HttpRequest.newBuilder(uri)
                        .header("content-type", "application/json")
                        .POST(HttpRequest.BodyPublishers.ofByteArray(body))
                        .build();
                try {
                    while (System.nanoTime() < end) {
                        if (client.send(request, HttpResponse.BodyHandlers.ofByteArray())
                                        .statusCode()
                                != 200) {
                            throw new IllegalStateException("not answered");
                        }
                        answered.incrementAndGet();
                    }
                } catch (IOException | InterruptedException e) {
                    throw new IllegalStateException(e);
                } finally {
                    done.countDown();
                }
            }));
        }
        threads.forEach(Thread::start);
        done.await();
        return answered.get() / (ROUND_NANOS / 1e9);
    }
}
