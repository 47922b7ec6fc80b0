// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import tariff.notice.Finding;

/** Settles which column gives what when several claim the same, and says what each is taken to be. */
record Columns(Header header, List<Finding> findings) {

    static Columns settle(Header header) {
        List<Finding> findings = new ArrayList<>();
        List<Heading> headings = new ArrayList<>(header.headings());
        Map<Meaning, List<Integer>> claims = new LinkedHashMap<>();
        for (int column = 0; column < headings.size(); column++) {
            if (headings.get(column).meaning().isUsed()) {
                claims.computeIfAbsent(headings.get(column).meaning(), meaning -> new ArrayList<>())
                        .add(column);
            }
        }
        claims.forEach((meaning, columns) -> choose(header, columns, headings, findings));
        Header settled = new Header(header.sheet(), header.line(), header.unitsBelow(), headings);
        for (int column = 0; column < headings.size(); column++) {
            int at = column;
            headings.get(column)
                    .remark()
                    .ifPresent(remark -> findings.add(
                            remark.isError()
                                    ? Finding.error(remark.code(), header.columnPlace(at), remark.message())
                                    : Finding.warning(remark.code(), header.columnPlace(at), remark.message())));
        }
        findings.addAll(missingDates(settled));
        return new Columns(settled, findings);
    }

    private static void choose(Header header, List<Integer> columns, List<Heading> headings, List<Finding> findings) {
        if (columns.size() < 2) {
            return;
        }
        int best = columns.stream()
                .mapToInt(column -> headings.get(column).rank())
                .min()
                .orElse(0);
        List<Integer> equals = columns.stream()
                .filter(column -> headings.get(column).rank() == best)
                .sorted((a, b) ->
                        headings.get(a).factor().compareTo(headings.get(b).factor()))
                .toList();
        int chosen = equals.get(0);
        boolean finer = equals.size() == 2
                && headings.get(chosen)
                                .factor()
                                .compareTo(headings.get(equals.get(1)).factor())
                        != 0;
        for (int column : columns) {
            if (column != chosen && (!equals.contains(column) || finer)) {
                headings.set(
                        column,
                        Heading.doubtful(
                                headings.get(column).name(),
                                header.columnPlace(chosen) + " gives the same; the two were not compared"));
            } else if (column != chosen) {
                findings.add(Finding.error(
                        "column-twice",
                        header.columnPlace(column),
                        "gives the same as " + header.columnPlace(chosen) + "; rename or remove one of them"));
            }
        }
    }

    private static List<Finding> missingDates(Header header) {
        boolean month = date(header, Meaning.When.MONTH).isPresent();
        boolean from = date(header, Meaning.When.FROM).isPresent();
        boolean to = date(header, Meaning.When.TO).isPresent();
        return month || (from && to)
                ? List.of()
                : List.of(Finding.error(
                                "no-period",
                                header.sheet().linePlace(header.line()),
                                "does not say which days were billed")
                        .allowed("a column Month, or the columns From and To"));
    }

    static Optional<Integer> date(Header header, Meaning.When when) {
        int at = header.headings().stream().map(Heading::meaning).toList().indexOf(new Meaning.Date(when));
        return at < 0 ? Optional.empty() : Optional.of(at);
    }

    /** One sentence for each column that has a name or figures. */
    List<String> understood() {
        List<String> lines = new ArrayList<>();
        for (int column = 0; column < header.headings().size(); column++) {
            Heading heading = header.headings().get(column);
            if (!heading.name().isEmpty() || heading.meaning().isUsed()) {
                String place = header.columnPlace(column);
                lines.add(Character.toUpperCase(place.charAt(0)) + place.substring(1) + ": " + said(heading));
            }
        }
        return lines;
    }

    private static String said(Heading heading) {
        Meaning meaning = heading.meaning();
        if (meaning instanceof Meaning.Reading reading) {
            String factor = heading.factor().compareTo(BigDecimal.ONE) == 0
                    ? ""
                    : ", × " + heading.factor().toPlainString();
            return reading.register().words()
                    + reading.window()
                            .map(name -> " in the window \"" + name + "\"")
                            .orElse("")
                    + factor
                    + (heading.percent() ? ", in per cent" : "");
        }
        if (meaning instanceof Meaning.Line line) {
            return "amount charged for \"" + line.name() + "\"";
        }
        if (meaning instanceof Meaning.Total) {
            return "amount of the bill";
        }
        if (meaning instanceof Meaning.Estimated) {
            return "whether a reading was estimated";
        }
        if (meaning instanceof Meaning.Date date) {
            return switch (date.when()) {
                case MONTH -> "the month billed";
                case YEAR -> "the year of the month billed";
                case FROM -> "first day billed";
                case TO -> "last day billed";
                case STATEMENT -> "date of the statement";
            };
        }
        return "ignored, " + ((Meaning.Ignored) meaning).reason();
    }
}
