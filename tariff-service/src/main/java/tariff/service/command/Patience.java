// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.io.PrintWriter;
import java.time.Duration;
import java.util.concurrent.Executors;
import java.util.concurrent.ScheduledExecutorService;
import java.util.concurrent.ScheduledFuture;
import java.util.concurrent.TimeUnit;
import picocli.CommandLine;
import picocli.CommandLine.IExecutionStrategy;
import picocli.CommandLine.ParseResult;

/** Runs a command and says on the standard error that it is still at work, again and again, if it takes long. */
public final class Patience implements IExecutionStrategy {
    private final Duration every;

    /** @param every how often it is said, and how long before the first time */
    public Patience(Duration every) {
        this.every = every;
    }

    @Override
    public int execute(ParseResult parsed) {
        IExecutionStrategy run = new CommandLine.RunLast();
        if (parsed.hasSubcommand() && parsed.subcommand().commandSpec().userObject() instanceof ServeCommand) {
            return run.execute(parsed);
        }
        PrintWriter err = parsed.commandSpec().commandLine().getErr();
        long start = System.nanoTime();
        ScheduledExecutorService clock = Executors.newSingleThreadScheduledExecutor(task -> {
            Thread thread = new Thread(task, "patience");
            thread.setDaemon(true);
            return thread;
        });
        ScheduledFuture<?> news = clock.scheduleAtFixedRate(
                () -> tell(err, start), every.toMillis(), every.toMillis(), TimeUnit.MILLISECONDS);
        try {
            return run.execute(parsed);
        } finally {
            news.cancel(true);
            clock.shutdown();
        }
    }

    private static void tell(PrintWriter err, long start) {
        err.println("still working after " + TimeUnit.NANOSECONDS.toSeconds(System.nanoTime() - start) + " s");
        err.flush();
    }
}
