// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import tariff.service.http.Examples;

/** Wrong rates, each with a mistake that people make, and what a check says of each. A pair more in the directory is a test more. */
class BadShelfTest {

    static Stream<String> wrongRates() {
        return Examples.in("examples/bad", ".json").stream()
                .map(file -> String.valueOf(file.getFileName()).replace(".json", ""));
    }

    private static Path file(String name) {
        return Examples.path("examples/bad/" + name);
    }

    @ParameterizedTest
    @MethodSource("wrongRates")
    void aWrongRateIsRefusedInTheseWords(String name) {
        Printed ran = Printed.by("check", file(name + ".json"));
        assertThat(ran.exit()).isEqualTo(Exit.FINDINGS);
        assertThat(ran.out()).isEmpty();
        assertThat(ran.err()).isEqualTo(Examples.read(file(name + ".findings.txt")));
    }

    @Test
    void noFindingsAreLeftWithoutTheirRate() {
        assertThat(Examples.in("examples/bad", ".findings.txt").stream()
                        .map(file -> String.valueOf(file.getFileName()).replace(".findings.txt", "")))
                .containsExactlyElementsOf(wrongRates().toList())
                .hasSizeGreaterThanOrEqualTo(10);
    }
}
