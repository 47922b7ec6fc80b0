// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import java.util.List;
import tariff.notice.Finding;

/** A request that is not answered: status, a sentence, and what is wrong with the document if that is why. */
final class Problem extends RuntimeException {
    private final int status;
    private final transient List<Finding> findings;

    Problem(int status, String detail) {
        this(status, detail, List.of());
    }

    Problem(int status, String detail, List<Finding> findings) {
        super(detail, null, false, false);
        this.status = status;
        this.findings = List.copyOf(findings);
    }

    int status() {
        return status;
    }

    String detail() {
        return String.valueOf(getMessage());
    }

    List<Finding> findings() {
        return findings;
    }
}
