// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Optional;
import java.util.function.Function;
import tariff.intervalfile.IntervalFile;
import tariff.intervalfile.IntervalFileOptions;
import tariff.intervalfile.IntervalReading;
import tariff.json.JsonTree;
import tariff.notice.Finding;
import tariff.notice.Refusal;
import tariff.proposal.Offer;
import tariff.proposal.Proposal;
import tariff.rate.Rate;
import tariff.service.request.PriceTerms;
import tariff.service.request.Request;

/** The files that commands are given; what is wrong with one is said with its name. */
final class Files {
    private Files() {}

    static Rate rate(Path file) {
        return read(file, bytes -> Rate.of(JsonTree.read(bytes)));
    }

    static Rate.Checked check(Path file) {
        return read(file, bytes -> Rate.check(JsonTree.read(bytes)));
    }

    static IntervalReading intervals(Path file, IntervalFileOptions choices) {
        try {
            return IntervalFile.read(file, choices);
        } catch (IOException e) {
            throw unreadable(file);
        }
    }

    static Proposal proposal(Path file) {
        return asked(file, Request::proposal);
    }

    static Offer offer(Path file) {
        return asked(file, Request::offer);
    }

    /** The bank and the network of a file, which may be a proposal or an offer. */
    static Proposal screened(Path file) {
        return asked(file, Request::screenedOffer);
    }

    static PriceTerms prices(Path file) {
        return asked(file, Request::prices);
    }

    private static <T> T asked(Path file, Function<Request, Optional<T>> part) {
        return read(file, bytes -> {
            Request request = new Request(JsonTree.read(bytes));
            Optional<T> asked = part.apply(request);
            request.refuseIfWrong();
            return asked.orElseThrow();
        });
    }

    private static Refusal unreadable(Path file) {
        return new Refusal(Finding.error("unreadable", file.toString(), "cannot be read")
                .found(java.nio.file.Files.exists(file) ? "a file that cannot be opened" : "no such file"));
    }

    /**
     * What a file holds.
     *
     * @throws Refusal with the file's name before every place
     */
    static <T> T read(Path file, Function<byte[], T> read) {
        try {
            return read.apply(java.nio.file.Files.readAllBytes(file));
        } catch (IOException e) {
            throw unreadable(file);
        } catch (Refusal refusal) {
            throw new Refusal(refusal.findings().stream()
                    .map(finding -> finding.inside(file.getFileName() + (isPointer(finding) ? "#" : ": ")))
                    .toList());
        }
    }

    private static boolean isPointer(Finding finding) {
        return finding.where().isEmpty() || finding.where().startsWith("/");
    }
}
