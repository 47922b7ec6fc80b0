// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import tariff.notice.Finding;

/**
 * Numbers to the right of the last name. They appear when a figure such as {@code 12,5} stands without quotes in a file
 * separated by commas, and every figure after it has then moved one column.
 */
final class StrayCells {
    private static final Pattern NUMBER = Pattern.compile("[0-9.,]+");

    private StrayCells() {}

    static List<Finding> find(Header header, Body body) {
        int names = header.headings().size();
        while (names > 0
                && header.headings().get(names - 1).name().isEmpty()
                && !header.headings().get(names - 1).meaning().isUsed()) {
            names--;
        }
        List<Finding> findings = new ArrayList<>();
        for (Body.BilledLine line : body.months()) {
            for (int column = names; column < header.headings().size(); column++) {
                String cell = header.sheet().cell(line.line(), column);
                if (NUMBER.matcher(cell).matches()) {
                    findings.add(Finding.error(
                                    "number-beyond-names",
                                    header.place(line.line(), column),
                                    "stands beyond the last name; if figures have decimal commas, put them in quotes or separate"
                                            + " the columns by semicolons")
                            .found(cell));
                    break;
                }
            }
        }
        return findings;
    }
}
