// SPDX-License-Identifier: Apache-2.0
package tariff.service.shelf;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.Stream;
import tariff.json.JsonTree;
import tariff.notice.Finding;
import tariff.notice.Refusal;
import tariff.rate.Rate;

/** Usable rates by id; read once, never changed. */
public final class Shelf {
    private static final String ENDING = ".json";
    private static final String ID = "[a-z0-9][a-z0-9-]{0,79}";

    private final SortedMap<String, Rate> rates = new TreeMap<>();
    private final Map<String, Object> documents = new TreeMap<>();

    private Shelf() {}

    public static Shelf empty() {
        return new Shelf();
    }

    /**
     * The rates in a directory: every file whose name ends in {@code .json}, its name without the ending being the id.
     *
     * @throws Refusal with everything that is wrong with any of them
     * @throws UncheckedIOException if the directory or a file cannot be read
     */
    public static Shelf read(Path directory) {
        Shelf shelf = new Shelf();
        List<Finding> findings = new ArrayList<>();
        for (Path file : files(directory)) {
            try {
                shelf.add(file);
            } catch (Refusal refusal) {
                refusal.findings().stream()
                        .map(finding -> finding.inside(file.getFileName() + "#"))
                        .forEach(findings::add);
            }
        }
        if (!findings.isEmpty()) {
            throw new Refusal(findings);
        }
        return shelf;
    }

    private static List<Path> files(Path directory) {
        try (Stream<Path> files = Files.list(directory)) {
            return files.filter(file -> file.toString().endsWith(ENDING))
                    .sorted()
                    .toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private void add(Path file) {
        String name = String.valueOf(file.getFileName());
        String id = name.substring(0, name.length() - ENDING.length());
        if (!id.matches(ID)) {
            throw new Refusal(Finding.error("id", "", "has a name that cannot be an id")
                    .found(id)
                    .allowed("small letters, digits and hyphens"));
        }
        try {
            Object document = JsonTree.read(Files.readAllBytes(file));
            rates.put(id, Rate.of(document));
            documents.put(id, java.util.Objects.requireNonNull(document));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The rates in the order of their ids. */
    public SortedMap<String, Rate> rates() {
        return Collections.unmodifiableSortedMap(rates);
    }

    public Optional<Rate> rate(String id) {
        return Optional.ofNullable(rates.get(id));
    }

    /** A rate as it stands in its file. */
    public Optional<Object> document(String id) {
        return Optional.ofNullable(documents.get(id));
    }
}
