// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import java.util.stream.Collectors;

/** The discount rate at which flows are worth nothing (IRR). */
public final class InternalReturn {
    private static final MathContext TWELVE_DIGITS = new MathContext(12);

    private InternalReturn() {}

    /** Of yearly flows, each at the end of its year, year 0 first. */
    public static Answer<BigDecimal> ofYears(List<BigDecimal> flows) {
        return of(flows, 1);
    }

    /** Of monthly flows, each at the end of its month, month 0 first, as an effective yearly rate. */
    public static Answer<BigDecimal> ofMonths(List<BigDecimal> flows) {
        return of(flows, 12);
    }

    /**
     * Searched between −99 % and 1e11 %; to twelve significant figures at most, as near as doubles allow. Flows that change sign
     * once have one rate. Flows that change it more often may have several; if they sum to a gain, rates below zero are passed
     * over, since a gain at a rate of nothing can only be used up by a positive one.
     */
    private static Answer<BigDecimal> of(List<BigDecimal> flows, int periodsPerYear) {
        if (flows.stream().allMatch(flow -> flow.signum() >= 0)) {
            return Answer.notApplicable("no flow is a cost, so there is nothing to earn a return on");
        }
        if (flows.stream().allMatch(flow -> flow.signum() <= 0)) {
            return Answer.notApplicable("no flow is a gain, so no rate of return recovers the cost");
        }
        boolean gain = flows.stream().reduce(BigDecimal.ZERO, BigDecimal::add).signum() > 0;
        double[] doubles = flows.stream().mapToDouble(BigDecimal::doubleValue).toArray();
        List<BigDecimal> rates = new Balance(periodsPerYear)
                .rates(doubles).stream()
                        .filter(rate -> rate > 0 || !gain)
                        .map(rate -> new BigDecimal(rate, TWELVE_DIGITS))
                        .toList();
        if (rates.isEmpty()) {
            return Answer.notApplicable("no rate of return fits these flows; use the net present value");
        }
        return rates.size() == 1 ? Answer.known(rates.get(0)) : Answer.notApplicable(several(rates));
    }

    private static String several(List<BigDecimal> rates) {
        String most =
                rates.subList(0, rates.size() - 1).stream().map(Words::percent).collect(Collectors.joining(", "));
        return "flows change sign more than once and several rates fit: " + most + " and "
                + Words.percent(rates.get(rates.size() - 1)) + "; use the net present value";
    }
}
