// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import tariff.notice.Finding;

/**
 * The decimal mark of a file: as chosen, or as some cell proves that can be read in one way only.
 *
 * @param mark the mark; empty if no cell needs one or cells prove both
 * @param why the sentence that says so, empty if no cell needs a mark
 */
record NumberReading(Optional<DecimalMark> mark, Optional<String> why, List<Finding> findings) {
    private static final BigDecimal HIGHEST_POWER_FACTOR = new BigDecimal("100");

    private record Cell(NumberCell cell, int line, int column) {}

    static NumberReading judge(Header header, Body body, Optional<DecimalMark> choice) {
        if (choice.isPresent()) {
            return new NumberReading(
                    choice, Optional.of("Decimal mark: " + choice.get().word() + ", as chosen"), List.of());
        }
        List<Cell> cells = cells(header, body);
        Optional<Cell> point = proof(cells, DecimalMark.POINT);
        Optional<Cell> comma = proof(cells, DecimalMark.COMMA);
        if (point.isPresent() != comma.isPresent()) {
            DecimalMark mark = point.isPresent() ? DecimalMark.POINT : DecimalMark.COMMA;
            Cell cell = point.or(() -> comma).orElseThrow();
            String why =
                    "Decimal mark: " + mark.word() + ", shown by " + text(header, cell) + " in " + place(header, cell);
            return new NumberReading(Optional.of(mark), Optional.of(why), List.of());
        }
        List<Finding> findings = new ArrayList<>();
        if (point.isPresent() && comma.isPresent()) {
            findings.add(Finding.warning(
                    "decimal-marks-mixed",
                    place(header, comma.get()),
                    "is written with a decimal comma, while " + text(header, point.get()) + " in "
                            + place(header, point.get()) + " is written with a point"));
        }
        List<Cell> unclear =
                cells.stream().filter(cell -> cell.cell().isAmbiguous()).toList();
        if (!unclear.isEmpty()) {
            findings.add(ask(header, unclear.get(0), unclear.size() - 1));
        }
        return new NumberReading(Optional.empty(), Optional.empty(), findings);
    }

    /** The value of a cell; empty if it has none in this reading. */
    Optional<BigDecimal> value(NumberCell cell) {
        return mark.isPresent() ? cell.value(mark.get()) : cell.point().or(cell::comma);
    }

    static NumberCell cell(Heading heading, String text) {
        NumberCell cell = NumberCell.of(text);
        return heading.meaning().isPowerFactor() ? cell.atMost(HIGHEST_POWER_FACTOR) : cell;
    }

    private static Finding ask(Header header, Cell cell, int more) {
        return Finding.error(
                        "number-ambiguous",
                        place(header, cell),
                        "may be " + cell.cell().point().orElseThrow().toPlainString() + " or "
                                + cell.cell().comma().orElseThrow().toPlainString()
                                + ", and nothing in the file tells which"
                                + (more > 0 ? " (" + more + " more like it)" : ""))
                .found(text(header, cell))
                .allowed("decimal = comma | point");
    }

    private static Optional<Cell> proof(List<Cell> cells, DecimalMark mark) {
        return cells.stream()
                .filter(cell -> cell.cell().proves().filter(mark::equals).isPresent())
                .findFirst();
    }

    private static List<Cell> cells(Header header, Body body) {
        IntStream lines = IntStream.concat(
                body.months().stream().mapToInt(Body.BilledLine::line),
                body.totals().stream().mapToInt(Integer::intValue));
        return lines.boxed()
                .flatMap(line -> IntStream.range(0, header.headings().size())
                        .boxed()
                        .flatMap(column -> number(header, line, column)))
                .toList();
    }

    private static Stream<Cell> number(Header header, int line, int column) {
        Heading heading = header.headings().get(column);
        String text = header.sheet().cell(line, column);
        return heading.meaning().isNumber() && !NumberCell.isAbsent(text)
                ? Stream.of(new Cell(cell(heading, text), line, column))
                : Stream.of();
    }

    private static String place(Header header, Cell cell) {
        return header.place(cell.line(), cell.column());
    }

    private static String text(Header header, Cell cell) {
        return header.sheet().cell(cell.line(), cell.column());
    }
}
