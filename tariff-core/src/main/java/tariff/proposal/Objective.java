// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import tariff.correction.CapacitorBank;

/** What makes one bank better than another: the higher, the better. */
interface Objective {
    BigDecimal at(CapacitorBank bank);

    /** A figure that no bank between these two exceeds. */
    BigDecimal atMost(CapacitorBank smaller, CapacitorBank larger);
}
