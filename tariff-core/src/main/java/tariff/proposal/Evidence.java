// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.LAGGING_KVARH;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import tariff.bill.PowerFactorCost;
import tariff.bill.Statement;
import tariff.correction.CapacitorBank;
import tariff.correction.Estimate;
import tariff.meter.Derivable;
import tariff.meter.MeteredMonth;
import tariff.meter.Readings;
import tariff.meter.Register;
import tariff.meter.Triangle;

/** What claims are held against. */
record Evidence(Assessment assessment, Offer offer) {
    private static final int YEAR = 12;

    CapacitorBank bank() {
        return offer.proposal().bank();
    }

    boolean hasFullYear() {
        return assessment.today().months().size() == YEAR;
    }

    BankSavings savings(Estimate estimate) {
        return assessment.savings(estimate);
    }

    List<MeteredMonth> before() {
        return assessment.today().months().stream()
                .map(PowerFactorCost.Month::asItIs)
                .map(Statement::month)
                .toList();
    }

    List<MeteredMonth> after(Estimate estimate) {
        return savings(estimate).settledYear().stream().map(Statement::month).toList();
    }

    /** kWh of the year, if every month gives them. */
    Optional<BigDecimal> kwh() {
        return sum(before(), ENERGY_KWH);
    }

    /** A register summed over the months, empty if one lacks it. */
    static Optional<BigDecimal> sum(List<MeteredMonth> months, Register register) {
        BigDecimal sum = BigDecimal.ZERO;
        for (MeteredMonth month : months) {
            Optional<BigDecimal> value = read(month.totals(), register);
            if (value.isEmpty()) {
                return Optional.empty();
            }
            sum = sum.add(value.get());
        }
        return Optional.of(sum);
    }

    /** The highest of a register over the months, empty if one lacks it. */
    static Optional<BigDecimal> highest(List<MeteredMonth> months, Register register) {
        BigDecimal highest = BigDecimal.ZERO;
        for (MeteredMonth month : months) {
            Optional<BigDecimal> value = month.totals().get(register);
            if (value.isEmpty()) {
                return Optional.empty();
            }
            highest = highest.max(value.get());
        }
        return Optional.of(highest);
    }

    /** kWh ÷ √(kWh² + kvarh²) over all the months together. */
    static Optional<BigDecimal> powerFactor(List<MeteredMonth> months) {
        return sum(months, ENERGY_KWH)
                .filter(kwh -> kwh.signum() > 0)
                .flatMap(kwh -> sum(months, LAGGING_KVARH)
                        .map(kvarh -> Triangle.powerFactor(kwh, Triangle.apparent(kwh, kvarh))));
    }

    private static Optional<BigDecimal> read(Readings readings, Register register) {
        return readings.get(register)
                .or(() -> register == LAGGING_KVARH ? Derivable.LAGGING_KVARH.from(readings) : Optional.empty());
    }
}
