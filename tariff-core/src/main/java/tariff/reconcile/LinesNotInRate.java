// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.math.BigDecimal;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import tariff.meter.Charged;
import tariff.meter.MeteredMonth;

/** The bill prints lines that the rate does not have, and the total holds them. */
record LinesNotInRate() implements Cause {

    @Override
    public String code() {
        return "lines-not-in-rate";
    }

    @Override
    public Stream<Trial> trials(Case bills) {
        return bills.open().stream()
                .flatMap(place ->
                        Stream.ofNullable(bills.charged().get(place)).flatMap(month -> without(bills, place, month)));
    }

    private Stream<Trial> without(Case bills, int place, ReconciledMonth month) {
        List<ReconciledLine> extra = month.lines().stream()
                .filter(line -> line.verdict() == Verdict.NOT_IN_RATE)
                .toList();
        MeteredMonth read = bills.months().get(place);
        Optional<BigDecimal> total = read.charged().total();
        if (extra.isEmpty() || total.isEmpty()) {
            return Stream.empty();
        }
        BigDecimal sum = extra.stream().map(ReconciledLine::difference).reduce(BigDecimal.ZERO, BigDecimal::add);
        Map<String, BigDecimal> lines = new LinkedHashMap<>(read.charged().lines());
        extra.forEach(line -> lines.remove(line.name()));
        String names = extra.stream()
                .map(line -> "\"" + line.name() + "\" " + Digits.shown(line.difference()))
                .collect(Collectors.joining(", "));
        return Stream.of(bills.read(
                this,
                names + " left out, which the rate does not have",
                Map.of(
                        place,
                        read.withCharged(new Charged(Optional.of(total.get().subtract(sum)), lines)))));
    }
}
