// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.function.Function;
import tariff.bill.Billing;
import tariff.bill.Statement;
import tariff.bill.StatementLine;
import tariff.meter.MeteredMonth;
import tariff.meter.Readings;
import tariff.meter.Register;
import tariff.notice.Refusal;

/**
 * How much of a difference rounding can explain: what the amount moves by when each printed register moves by half a unit of its last
 * printed digit, up or down, all moves added up; and half a cent for each line of the rate. What a register does to an amount is found by
 * billing the month again, so that it holds for steps and blocks too. Own definition; there is no source for one.
 *
 * @param total for the total of the bill
 * @param lines for each line by name
 */
public record Slack(BigDecimal total, Map<String, BigDecimal> lines) {
    private static final BigDecimal HALF_A_CENT = new BigDecimal("0.005");
    private static final Slack NONE = new Slack(BigDecimal.ZERO, Map.of());

    public Slack {
        lines = Map.copyOf(lines);
    }

    static Slack none() {
        return NONE;
    }

    BigDecimal line(String name) {
        return lines.getOrDefault(name, BigDecimal.ZERO);
    }

    /** @param past the months before, in order */
    static Slack of(Billing billing, List<MeteredMonth> past, Statement statement) {
        BigDecimal total =
                HALF_A_CENT.multiply(BigDecimal.valueOf(statement.lines().size()));
        Map<String, BigDecimal> lines = new HashMap<>();
        statement.lines().forEach(line -> lines.put(line.name(), HALF_A_CENT));
        for (List<MeteredMonth> upAndDown : moved(statement.month())) {
            List<Statement> others = upAndDown.stream()
                    .flatMap(month -> billed(billing, past, month).stream())
                    .toList();
            total = total.add(most(others, other -> other.total().subtract(statement.total())));
            for (StatementLine line : statement.lines()) {
                BigDecimal most =
                        most(others, other -> other.amount(line.name()).subtract(line.amount()));
                lines.merge(line.name(), most, BigDecimal::add);
            }
        }
        return new Slack(total, lines);
    }

    private static BigDecimal most(List<Statement> others, Function<Statement, BigDecimal> move) {
        return others.stream().map(move).map(BigDecimal::abs).reduce(BigDecimal.ZERO, BigDecimal::max);
    }

    /** Empty for a register that the rate cannot bill half a digit away; it then adds nothing. */
    private static Optional<Statement> billed(Billing billing, List<MeteredMonth> past, MeteredMonth month) {
        try {
            return Optional.of(billing.statements(past, List.of(month)).get(0));
        } catch (Refusal refused) {
            return Optional.empty();
        }
    }

    /** For each printed register the month with it half a digit higher and half a digit lower. */
    private static List<List<MeteredMonth>> moved(MeteredMonth month) {
        List<List<MeteredMonth>> all = new ArrayList<>();
        month.totals()
                .values()
                .keySet()
                .forEach(register -> all.add(moved(month.totals(), register).stream()
                        .map(month::with)
                        .toList()));
        month.windows()
                .forEach((window, readings) -> readings.values().keySet().forEach(register -> {
                    List<MeteredMonth> upAndDown = new ArrayList<>();
                    for (Readings moved : moved(readings, register)) {
                        Map<String, Readings> windows = new TreeMap<>(month.windows());
                        windows.put(window, moved);
                        upAndDown.add(month.withWindows(windows));
                    }
                    all.add(upAndDown);
                }));
        return all;
    }

    private static List<Readings> moved(Readings readings, Register register) {
        BigDecimal value = readings.values().getOrDefault(register, BigDecimal.ZERO);
        BigDecimal half = Digits.halfOfLast(value);
        List<Readings> moved = new ArrayList<>();
        if (value.compareTo(half) > 0) {
            moved.add(readings.with(register, value.subtract(half)));
        }
        if (value.signum() > 0
                && (register != Register.POWER_FACTOR || value.add(half).compareTo(BigDecimal.ONE) <= 0)) {
            moved.add(readings.with(register, value.add(half)));
        }
        return moved;
    }
}
