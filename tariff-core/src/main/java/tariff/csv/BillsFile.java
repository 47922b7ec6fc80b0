// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.util.ArrayList;
import java.util.List;
import tariff.meter.MeteredMonth;
import tariff.notice.Finding;
import tariff.notice.Refusal;

/**
 * Reads past bills from a file that a spreadsheet exported: one month a row, or one month a column, with names for what was
 * noted. Nothing is guessed silently: the same file is always read the same way, and what it does not tell is asked.
 */
public final class BillsFile {
    private BillsFile() {}

    /**
     * Reads a file.
     *
     * @param bytes at most 2 MB of text separated by commas, semicolons, tabs or pipes
     * @param choices what the file itself may not tell
     * @throws Refusal naming every cell that cannot be read, every question that the file leaves open, and every period billed
     *     twice, by row and column of the file
     */
    public static BillsRead read(byte[] bytes, ReadingChoices choices) {
        TextFile file = TextFile.of(bytes);
        Layout layout = Layout.of(file.text(), new HeadingReader(choices));
        Columns columns = Columns.settle(layout.header());
        Header header = columns.header();
        List<Finding> findings = new ArrayList<>(columns.findings());
        if (hasErrors(findings)) {
            throw new Refusal(findings);
        }
        Body body = Body.of(header);
        findings.addAll(body.findings());
        findings.addAll(StrayCells.find(header, body));
        DateReading dates = DateReading.judge(header, body, choices.dates());
        dates.question().ifPresent(findings::add);
        NumberReading numbers = NumberReading.judge(header, body, choices.decimal());
        findings.addAll(numbers.findings());

        PeriodReading periods = PeriodReading.of(header, body, dates.order());
        if (dates.question().isEmpty()) {
            findings.addAll(periods.findings());
        }
        MonthReader reader = new MonthReader(header, dates.order(), numbers, findings);
        List<MeteredMonth> months = periods.billed().stream().map(reader::read).toList();
        if (hasErrors(findings)) {
            throw new Refusal(findings);
        }

        List<String> understood = new ArrayList<>();
        understood.add("Encoding: " + file.encoding());
        understood.add("Separator: " + layout.separator());
        numbers.why().ifPresent(understood::add);
        dates.why().ifPresent(understood::add);
        understood.add("Names: in " + header.sheet().linePlace(header.line())
                + (header.unitsBelow() ? ", units below them" : "")
                + (header.sheet().across() ? ", one month a column" : ", one month a row"));
        understood.addAll(columns.understood());
        understood.addAll(periods.understood());
        understood.addAll(body.skipped());
        return new BillsRead(months, understood, findings);
    }

    private static boolean hasErrors(List<Finding> findings) {
        return findings.stream().anyMatch(Finding::isError);
    }
}
