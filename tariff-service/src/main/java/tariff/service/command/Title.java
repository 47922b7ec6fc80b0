// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import tariff.bill.Billing;

/** The first line of an answer: which site, which rate, in what money. */
final class Title {
    private Title() {}

    static String of(Billing billing) {
        String site = billing.site().name();
        return (site.isEmpty() ? "" : site + " under ") + billing.rate().name() + ", amounts in "
                + billing.rate().currency();
    }
}
