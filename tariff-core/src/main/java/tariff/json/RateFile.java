// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import tariff.notice.Refusal;
import tariff.rate.Rate;

/** Rates as JSON documents. */
public final class RateFile {
    private RateFile() {}

    /**
     * The rate in a file.
     *
     * @throws Refusal with everything that is wrong with it
     * @throws UncheckedIOException if the file cannot be read
     */
    public static Rate read(Path file) {
        try {
            return Rate.of(JsonTree.read(Files.readAllBytes(file)));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /**
     * The rate in a text.
     *
     * @throws Refusal with everything that is wrong with it
     */
    public static Rate parse(String json) {
        return Rate.of(JsonTree.read(json.getBytes(StandardCharsets.UTF_8)));
    }
}
