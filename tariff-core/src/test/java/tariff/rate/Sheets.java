// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import java.nio.charset.StandardCharsets;
import java.util.List;
import tariff.json.JsonTree;
import tariff.notice.Finding;

/** Rate files in short: single quotes stand for double ones. */
final class Sheets {
    private Sheets() {}

    static final String ENERGY = "{ 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'price': 0.1 }";

    /** A rate with one power factor "billing" from energies. */
    static String rate(String definitions, String... lines) {
        return "{ 'name': 'Sheet', 'currency': 'EUR', 'powerFactors': { 'billing': { 'from': 'energies' } }, "
                + definitions + " 'lines': [" + String.join(", ", lines) + "] }";
    }

    /** A rate without power factors. */
    static String plain(String definitions, String... lines) {
        return "{ 'name': 'Sheet', 'currency': 'EUR', " + definitions + " 'lines': [" + String.join(", ", lines)
                + "] }";
    }

    /** A percentage of 100 by the given schedule of "billing". */
    static String scheduled(String schedule) {
        return rate(
                "",
                "{ 'name': 'Bill', 'quantity': { 'constant': 100 }, 'price': 1 }",
                "{ 'name': 'PF', 'percentOf': ['Bill'], 'schedule': { 'powerFactor': 'billing', " + schedule + " } }");
    }

    static Rate.Checked check(String sheet) {
        return Rate.check(JsonTree.read(sheet.replace('\'', '"').getBytes(StandardCharsets.UTF_8)));
    }

    static List<String> findings(String sheet) {
        return check(sheet).findings().stream().map(Finding::toString).toList();
    }

    static RateWords words(String sheet) {
        Rate.Checked checked = check(sheet);
        return checked.rate()
                .orElseThrow(() -> new AssertionError(String.valueOf(checked.findings())))
                .words();
    }
}
