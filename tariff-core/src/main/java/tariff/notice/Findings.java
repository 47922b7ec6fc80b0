// SPDX-License-Identifier: Apache-2.0
package tariff.notice;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;

/** Collects findings, up to as many as anybody reads; an error is never lost behind warnings. */
public final class Findings implements Consumer<Finding> {
    private static final int MOST = 500;

    private final List<Finding> kept = new ArrayList<>();
    private boolean errors;

    @Override
    public void accept(Finding finding) {
        boolean firstError = finding.isError() && !errors;
        errors |= finding.isError();
        if (kept.size() < MOST || firstError) {
            kept.add(finding);
        }
    }

    public boolean hasErrors() {
        return errors;
    }

    /** Those kept, in the order they were made. */
    public List<Finding> list() {
        return List.copyOf(kept);
    }
}
