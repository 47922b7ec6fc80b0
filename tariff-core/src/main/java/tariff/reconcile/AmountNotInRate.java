// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.math.BigDecimal;
import java.util.List;
import java.util.stream.Stream;

/** The same amount in every period that the rate does not have, such as a meter rent; at least two months must differ by it. */
record AmountNotInRate() implements Cause {

    @Override
    public String code() {
        return "amount-not-in-rate";
    }

    @Override
    public Stream<Trial> trials(Case bills) {
        List<BigDecimal> differences = bills.open().stream()
                .flatMap(place -> Stream.ofNullable(bills.charged().get(place)))
                .map(month -> month.difference().stripTrailingZeros())
                .filter(difference -> difference.signum() != 0)
                .toList();
        return differences.stream()
                .filter(each -> differences.indexOf(each) < differences.lastIndexOf(each))
                .distinct()
                .limit(2)
                .flatMap(each -> bills.written(
                        this,
                        Digits.shown(each.setScale(Math.max(2, each.scale())))
                                + " a period, which the rate does not have,",
                        AddedLine.amount(bills.source(), each)));
    }
}
