// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.EnumMap;
import java.util.Map;
import java.util.function.Function;
import tariff.correction.CapacitorBank;
import tariff.correction.Estimate;
import tariff.meter.Triangle;
import tariff.payback.Investment;
import tariff.payback.Outlook;
import tariff.payback.Savings;
import tariff.payback.SimplePayback;
import tariff.payback.Venture;

/** What banks are worth, in each of the ways they can be compared. */
final class Weighing {
    private static final BigDecimal CENT = new BigDecimal("0.01");

    private final RepeatedYear year;
    private final PriceList prices;
    private final Outlook outlook;
    private final Worth worth;

    Weighing(RepeatedYear year, PriceList prices, Outlook outlook) {
        this.year = year;
        this.prices = prices;
        this.outlook = outlook;
        this.worth = Worth.of(prices.lifeYears(), outlook);
    }

    BigDecimal value(CapacitorBank bank, Estimate estimate) {
        return worth.net(prices.of(bank), year.saved(bank, estimate));
    }

    /** The smaller bank's price with savings that none of the two or between them exceeds. */
    BigDecimal valueAtMost(CapacitorBank smaller, CapacitorBank larger, Estimate estimate) {
        return worth.net(prices.of(smaller), year.atMost(smaller, larger, estimate));
    }

    Objective highestValue(Estimate estimate) {
        return new Objective() {
            @Override
            public BigDecimal at(CapacitorBank bank) {
                return value(bank, estimate);
            }

            @Override
            public BigDecimal atMost(CapacitorBank smaller, CapacitorBank larger) {
                return valueAtMost(smaller, larger, estimate);
            }
        };
    }

    /** A year's net savings for each unit of money that the bank costs, the inverse of the simple payback. */
    Objective shortestPayback(Estimate estimate) {
        return new Objective() {
            @Override
            public BigDecimal at(CapacitorBank bank) {
                return yearlyReturn(prices.of(bank), year.saved(bank, estimate));
            }

            @Override
            public BigDecimal atMost(CapacitorBank smaller, CapacitorBank larger) {
                RepeatedYear.Saved most = year.atMost(smaller, larger, estimate);
                BigDecimal cheap = yearlyReturn(prices.of(smaller), most);
                // a loss is the smaller a part of the cost, the dearer the bank
                return cheap.signum() >= 0
                        ? cheap
                        : cheap.multiply(prices.of(smaller).netCost().max(CENT))
                                .divide(prices.of(larger).netCost().max(CENT), Triangle.PRECISION);
            }
        };
    }

    private static BigDecimal yearlyReturn(Investment bank, RepeatedYear.Saved saved) {
        return saved.settledYear()
                .subtract(bank.yearlyUpkeep())
                .divide(bank.netCost().max(CENT), Triangle.PRECISION);
    }

    /** The least of the worst regrets; a regret is what the best size for an estimate, or none, is worth above this one. */
    Objective leastRegret(Map<Estimate, BigDecimal> best) {
        return new Objective() {
            @Override
            public BigDecimal at(CapacitorBank bank) {
                return regret(best, each -> value(bank, each)).negate();
            }

            @Override
            public BigDecimal atMost(CapacitorBank smaller, CapacitorBank larger) {
                return regret(best, each -> valueAtMost(smaller, larger, each)).negate();
            }
        };
    }

    private static BigDecimal regret(Map<Estimate, BigDecimal> best, Function<Estimate, BigDecimal> value) {
        return best.entrySet().stream()
                .map(each -> each.getValue().subtract(value.apply(each.getKey())))
                .max(BigDecimal::compareTo)
                .orElseThrow();
    }

    SizedBank sized(CapacitorBank bank) {
        Investment investment = prices.of(bank);
        Map<Estimate, SizedBank.Gain> gains = new EnumMap<>(Estimate.class);
        for (Estimate estimate : Estimate.values()) {
            BankSavings savings = year.savings(bank, estimate);
            Venture venture = new Venture(
                    investment, new Savings(savings.firstYearMonths(), savings.settledYearMonths()), outlook);
            gains.put(
                    estimate,
                    new SizedBank.Gain(
                            savings.firstYearTotal(),
                            savings.settledYearTotal(),
                            value(bank, estimate),
                            SimplePayback.years(venture)));
        }
        return new SizedBank(bank, investment, gains);
    }
}
