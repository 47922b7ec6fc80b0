// SPDX-License-Identifier: Apache-2.0
package tariff.notice;

import java.util.List;
import java.util.stream.Collectors;

/** An input that cannot be used, with everything that is wrong with it at once. */
public final class Refusal extends RuntimeException {
    private final transient List<Finding> findings;

    /** @param findings at least one of them an error */
    public Refusal(List<Finding> findings) {
        super(findings.stream().map(Finding::toString).collect(Collectors.joining("\n")));
        this.findings = List.copyOf(findings);
    }

    public Refusal(Finding finding) {
        this(List.of(finding));
    }

    public List<Finding> findings() {
        return findings;
    }
}
