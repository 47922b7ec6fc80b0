// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** What a screen asked for and did not get. Ask for everything, then look whether anything is missing. */
final class Needs {
    private final List<String> missing = new ArrayList<>();

    /** The figure, or NaN with its name noted. */
    double of(OptionalDouble figure, String name) {
        if (figure.isEmpty()) {
            missing.add(name);
        }
        return figure.orElse(Double.NaN);
    }

    /** The thing, or a stand-in with its name noted. */
    <T> T of(Optional<T> thing, T standIn, String name) {
        if (thing.isEmpty()) {
            missing.add(name);
        }
        return thing.orElse(standIn);
    }

    void add(String name) {
        missing.add(name);
    }

    boolean any() {
        return !missing.isEmpty();
    }

    /** {@code needs the service voltage, the ambient temperature}. */
    @Override
    public String toString() {
        return "needs " + String.join(", ", missing);
    }
}
