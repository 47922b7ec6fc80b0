// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

/** The example files, wherever the tests are started. */
public final class Examples {
    private static final Path ROOT = Files.isDirectory(Path.of("examples")) ? Path.of("") : Path.of("..");

    private Examples() {}

    public static Path path(String name) {
        return ROOT.resolve(name);
    }

    public static String text(String name) {
        return read(path(name));
    }

    public static String read(Path file) {
        try {
            return Files.readString(file);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    public static List<Path> rates() {
        return in("examples/rates", ".json");
    }

    /** The files of a directory whose names end so, in order. */
    public static List<Path> in(String directory, String ending) {
        try (Stream<Path> files = Files.list(path(directory))) {
            return files.filter(file -> file.toString().endsWith(ending))
                    .sorted()
                    .toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
