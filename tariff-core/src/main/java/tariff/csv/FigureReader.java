// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import tariff.notice.Finding;

/** One cell as an exact figure of its column, in the unit of the register. */
final class FigureReader {
    private static final String ALLOWED = "a number such as 1234.5; nothing or n/a where there is no figure";
    private static final Pattern SPREADSHEET_ERROR =
            Pattern.compile("#(REF!|DIV/0!|VALUE!|NAME\\?|NUM!|NULL!|WERT!|BEZUG!|#+)");

    private FigureReader() {}

    /** An amount of money, which may be negative. */
    static Optional<BigDecimal> amount(MonthReader.Cell cell, NumberReading numbers, List<Finding> findings) {
        return number(cell, numbers, findings).flatMap(number -> {
            if (number.unit().isPresent() || number.percent()) {
                findings.add(
                        cell.error("not-a-number", "is not an amount of money").allowed(ALLOWED));
                return Optional.empty();
            }
            return numbers.value(number);
        });
    }

    static Optional<BigDecimal> read(MonthReader.Cell cell, NumberReading numbers, List<Finding> findings) {
        Meaning.Reading reading = (Meaning.Reading) cell.heading().meaning();
        if (cell.heading().meaning().isPowerFactor()) {
            return PowerFactorCell.read(cell, numbers, findings);
        }
        Optional<NumberCell> number = number(cell, numbers, findings);
        Optional<BigDecimal> value = number.flatMap(numbers::value);
        if (number.isEmpty() || value.isEmpty()) {
            return Optional.empty();
        }
        if (number.get().percent()
                || number.get()
                        .unit()
                        .filter(unit -> unit.unit() != reading.register().unit())
                        .isPresent()) {
            findings.add(cell.error("other-unit", "is in another unit than its column")
                    .allowed("a figure in " + reading.register().unit().symbol()));
            return Optional.empty();
        }
        if (value.get().signum() < 0) {
            findings.add(cell.error(
                            "below-zero",
                            "is below zero; a minus may mean leading or sent back, which have columns of their own")
                    .allowed("0 or more"));
            return Optional.empty();
        }
        BigDecimal factor =
                number.get().unit().map(UnitWord::factor).orElse(cell.heading().factor());
        return Optional.of(
                factor.compareTo(BigDecimal.ONE) == 0
                        ? value.get()
                        : value.get().multiply(factor));
    }

    /** Empty where there is no figure, or with a finding where there is something else. */
    static Optional<NumberCell> number(MonthReader.Cell cell, NumberReading numbers, List<Finding> findings) {
        if (NumberCell.isAbsent(cell.text())) {
            return Optional.empty();
        }
        NumberCell number = NumberReading.cell(cell.heading(), cell.text());
        if (number.isNothing()) {
            findings.add(
                    SPREADSHEET_ERROR.matcher(cell.text()).matches()
                            ? cell.error(
                                            "spreadsheet-error",
                                            "is a spreadsheet's mark for a formula that failed or a column too narrow")
                                    .allowed(ALLOWED)
                            : cell.error("not-a-number", "is not a number").allowed(ALLOWED));
            return Optional.empty();
        }
        if (numbers.value(number).isEmpty()) {
            findings.add(cell.error(
                            "not-a-number",
                            "is not a number if the decimal mark is a "
                                    + numbers.mark().map(DecimalMark::word).orElse("point"))
                    .allowed(ALLOWED));
            return Optional.empty();
        }
        return Optional.of(number);
    }
}
