// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.time.Duration;
import java.util.concurrent.Callable;
import org.junit.jupiter.api.Test;
import picocli.CommandLine;
import picocli.CommandLine.Command;

class PatienceTest {
    private final StringWriter said = new StringWriter();

    /** Works until something has been said. */
    @Command
    private final class Slow implements Callable<Integer> {
        @Override
        public Integer call() throws InterruptedException {
            for (int waited = 0; said.toString().isEmpty() && waited < 10_000; waited++) {
                Thread.sleep(1);
            }
            return 7;
        }
    }

    @Test
    void aCommandThatTakesLongSaysThatItIsStillAtWork() {
        CommandLine line = new CommandLine(new Slow()).setErr(new PrintWriter(said));
        line.setExecutionStrategy(new Patience(Duration.ofMillis(1)));
        assertThat(line.execute()).as("the command's own exit code").isEqualTo(7);
        assertThat(said.toString()).startsWith("still working after 0 s");
    }

    @Test
    void aQuickCommandSaysNothing() {
        CommandLine line = new CommandLine(new Slow()).setErr(new PrintWriter(said));
        said.write("-");
        line.setExecutionStrategy(new Patience(Duration.ofDays(1)));
        assertThat(line.execute()).isEqualTo(7);
        assertThat(said.toString()).isEqualTo("-");
    }
}
