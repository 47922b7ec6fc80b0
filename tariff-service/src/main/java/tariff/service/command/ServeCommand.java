// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.CountDownLatch;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import tariff.service.http.Service;
import tariff.service.shelf.Shelf;

/** Serves the library over HTTP until the process is told to end. */
@Command(
        name = "serve",
        description =
                "Answers over HTTP; GET / says what can be asked. It has no log-in: keep it inside your own network.",
        mixinStandardHelpOptions = true)
@SuppressWarnings("NullAway.Init") // picocli fills them in
final class ServeCommand implements Callable<Integer> {
    private static final long STOP_MILLIS = 5_000;

    @Spec
    private CommandSpec spec;

    @Option(names = "--port", description = "${DEFAULT-VALUE} unless said; 0 takes any free one", defaultValue = "8080")
    private int port;

    @Option(
            names = "--shelf",
            paramLabel = "DIR",
            description = "a directory of rates, each served under its file name")
    private Optional<Path> shelf;

    @Option(
            names = "--most-upload",
            paramLabel = "BYTES",
            description = "how long uploaded interval data may be; ${DEFAULT-VALUE} unless said",
            defaultValue = "" + Service.MOST_UPLOAD_BYTES)
    private long mostUploadBytes;

    @Override
    public Integer call() throws InterruptedException {
        Service service = Service.build(shelf.map(Shelf::read).orElseGet(Shelf::empty), STOP_MILLIS, mostUploadBytes)
                .start(port);
        CountDownLatch ended = new CountDownLatch(1);
        Runtime.getRuntime().addShutdownHook(new Thread(() -> {
            service.stop();
            ended.countDown();
        }));
        spec.commandLine().getOut().println("Serving on port " + service.port());
        spec.commandLine().getOut().flush();
        ended.await();
        return Exit.OK;
    }
}
