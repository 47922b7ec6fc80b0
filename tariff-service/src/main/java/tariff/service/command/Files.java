// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.io.IOException;
import java.nio.file.Path;
import java.util.function.Function;
import tariff.json.BillsJson;
import tariff.json.JsonTree;
import tariff.meter.MeteredSite;
import tariff.notice.Finding;
import tariff.notice.Refusal;
import tariff.rate.Rate;

/** The files that commands are given; what is wrong with one is said with its name. */
final class Files {
    private Files() {}

    static Rate rate(Path file) {
        return named(file, bytes -> Rate.of(JsonTree.read(bytes)));
    }

    static Rate.Checked check(Path file) {
        return named(file, bytes -> Rate.check(JsonTree.read(bytes)));
    }

    /** Bills of any kind of file; the one place that tells the kinds apart. */
    static MeteredSite bills(Path file) {
        return named(file, BillsJson::read);
    }

    private static <T> T named(Path file, Function<byte[], T> read) {
        try {
            return read.apply(java.nio.file.Files.readAllBytes(file));
        } catch (IOException e) {
            throw new Refusal(Finding.error("unreadable", file.toString(), "cannot be read")
                    .found(java.nio.file.Files.exists(file) ? "a file that cannot be opened" : "no such file"));
        } catch (Refusal refusal) {
            throw new Refusal(refusal.findings().stream()
                    .map(finding -> finding.inside(file.getFileName() + "#"))
                    .toList());
        }
    }
}
