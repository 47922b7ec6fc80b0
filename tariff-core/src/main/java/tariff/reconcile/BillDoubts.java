// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.List;
import tariff.meter.MeteredMonth;
import tariff.notice.Finding;

public final class BillDoubts {
    private BillDoubts() {}

    public static List<Finding> of(List<MeteredMonth> m) {
        return List.of();
    }
}
