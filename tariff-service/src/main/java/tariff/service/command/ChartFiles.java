// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.Map;
import java.util.Optional;
import java.util.function.Supplier;
import picocli.CommandLine.Option;
import tariff.notice.Finding;
import tariff.notice.Refusal;

/** Where charts are written to, if anywhere. */
@SuppressWarnings("NullAway.Init") // picocli fills them in
final class ChartFiles {
    @Option(names = "--charts", paramLabel = "DIR", description = "writes charts into this directory, SVG files")
    private Optional<Path> directory;

    /**
     * Writes charts if they are asked for, and says on {@code notes} which.
     *
     * @param charts SVG documents by name, worked out only if they are asked for
     * @throws Refusal if they cannot be written
     */
    void write(Supplier<Map<String, String>> charts, PrintWriter notes) {
        if (directory.isPresent()) {
            charts.get().forEach((name, svg) -> notes.println("written: " + write(name + ".svg", svg)));
            notes.flush();
        }
    }

    private Path write(String name, String svg) {
        Path file = directory.orElseThrow().resolve(name);
        try {
            java.nio.file.Files.createDirectories(directory.orElseThrow());
            return java.nio.file.Files.writeString(file, svg);
        } catch (IOException e) {
            throw new Refusal(Finding.error("unwritable", file.toString(), "cannot be written"));
        }
    }
}
