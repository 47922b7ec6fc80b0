// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import java.util.function.Consumer;
import tariff.notice.Finding;

/** Warns of what is allowed but may not be meant. */
final class RateDoubts {
    private RateDoubts() {}

    static void check(RateDefinition rate, Consumer<Finding> findings) {}
}
