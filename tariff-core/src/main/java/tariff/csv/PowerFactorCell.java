// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import tariff.notice.Finding;

/** A printed power factor: a number up to 1, or per cent. A side written beside it, or a minus, is asked about. */
final class PowerFactorCell {
    private static final Pattern WITH_SIDE = Pattern.compile(
            "[-−+]?\\s*[0-9]*[.,]?[0-9]+\\s*%?\\s*(c|cap|l|lag|lagg|lagging|lead|leading|i|ind|inductive|capacitive|k)\\.?"
                    + "|[-−]\\s*[0-9]*[.,]?[0-9]+\\s*%?"
                    + "|(c|cap|l|lag|lead|i|ind|lagging|leading)\\.?\\s*[0-9]*[.,]?[0-9]+\\s*%?");
    private static final BigDecimal TEN = BigDecimal.TEN;

    private PowerFactorCell() {}

    static Optional<BigDecimal> read(MonthReader.Cell cell, NumberReading numbers, List<Finding> findings) {
        String text = Words.plain(cell.text()).strip();
        if (WITH_SIDE.matcher(text).matches()) {
            findings.add(cell.error(
                            "power-factor-side",
                            "carries a mark of its side, and such marks mean different things on different bills; give lagging"
                                    + " and leading kvarh, or write the power factor without the mark if the current lags")
                    .allowed("a number above 0 and at most 1, or per cent"));
            return Optional.empty();
        }
        Optional<NumberCell> number = FigureReader.number(cell, numbers, findings);
        Optional<BigDecimal> value = number.flatMap(numbers::value);
        if (number.isEmpty() || value.isEmpty()) {
            return Optional.empty();
        }
        BigDecimal written = value.get();
        boolean percent = number.get().percent() || written.compareTo(TEN) >= 0;
        boolean unclear = cell.heading().percent() && !percent;
        BigDecimal factor = percent ? written.movePointLeft(2) : written;
        if (unclear
                || number.get().unit().isPresent()
                || factor.signum() <= 0
                || factor.compareTo(BigDecimal.ONE) > 0) {
            findings.add(cell.error("not-a-power-factor", "is not a power factor")
                    .allowed("a number above 0 and at most 1, or per cent from 10 to 100"));
            return Optional.empty();
        }
        return Optional.of(factor);
    }
}
