// SPDX-License-Identifier: Apache-2.0
package tariff.service;

import java.time.Duration;
import tariff.service.command.Patience;
import tariff.service.command.Tariff;

/** The entry point. */
public final class Main {
    private Main() {}

    /** Runs a command and ends with its exit code: see {@link tariff.service.command.Exit}. */
    public static void main(String[] args) {
        System.exit(Tariff.commandLine()
                .setExecutionStrategy(new Patience(Duration.ofSeconds(2)))
                .execute(args));
    }
}
