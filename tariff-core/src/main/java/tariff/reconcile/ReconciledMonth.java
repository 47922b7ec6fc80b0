// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Supplier;
import java.util.stream.Stream;
import tariff.bill.Statement;
import tariff.bill.StatementLine;
import tariff.meter.Charged;
import tariff.meter.Period;

/**
 * A bill that was paid beside the statement worked out for it.
 *
 * @param statement what the rate asks
 * @param charged the total of the bill, or the sum of its lines where it gives no total
 * @param recomputed the statement's total, or the sum of those of its lines that the bill prints where it gives no total
 * @param lines the rate's lines in its order, then the lines that only the bill has; empty if the bill gives only a total
 * @param slack what rounding can explain; nothing where the month agrees to the cent
 * @param verdict the worst of the total's and of the lines that both have: two lines whose errors cancel do not agree
 */
public record ReconciledMonth(
        Statement statement,
        BigDecimal charged,
        BigDecimal recomputed,
        List<ReconciledLine> lines,
        Slack slack,
        Verdict verdict) {

    public ReconciledMonth {
        lines = List.copyOf(lines);
    }

    /** Compares what the month says was charged; empty if it says nothing. The slack is asked for only if something differs. */
    static Optional<ReconciledMonth> of(Statement statement, Supplier<Slack> slack) {
        Charged bill = statement.month().charged();
        if (bill.total().isEmpty() && bill.lines().isEmpty()) {
            return Optional.empty();
        }
        ReconciledMonth exact = of(statement, bill, Slack.none());
        return Optional.of(exact.verdict == Verdict.AGREES ? exact : of(statement, bill, slack.get()));
    }

    static ReconciledMonth of(Statement statement, Charged bill, Slack slack) {
        List<ReconciledLine> lines = lines(statement, bill.lines(), slack);
        BigDecimal charged = bill.total()
                .orElseGet(() -> sum(lines.stream()
                        .filter(line -> !shownOnly(statement, line.name()))
                        .flatMap(line -> line.charged().stream())));
        BigDecimal recomputed = bill.total().isPresent()
                ? statement.total()
                : sum(statement.lines().stream()
                        .filter(line -> !line.shownOnly() && bill.lines().containsKey(line.name()))
                        .map(StatementLine::amount));
        Verdict verdict = Verdict.of(charged.subtract(recomputed), slack.total());
        for (ReconciledLine line : lines) {
            boolean both = line.charged().isPresent() && line.recomputed().isPresent();
            verdict = both && line.verdict().compareTo(verdict) > 0 ? line.verdict() : verdict;
        }
        return new ReconciledMonth(statement, charged, recomputed, lines, slack, verdict);
    }

    public Period period() {
        return statement.month().period();
    }

    /** Charged less recomputed: above zero where more was charged than the rate asks. */
    public BigDecimal difference() {
        return charged.subtract(recomputed);
    }

    /** The distance that a cause has to close: the difference of the totals, or those of the lines if they are larger. */
    BigDecimal distance() {
        BigDecimal ofLines = sum(lines.stream()
                .filter(line -> line.charged().isPresent() && line.recomputed().isPresent())
                .map(line -> line.difference().abs()));
        return difference().abs().max(ofLines);
    }

    private static List<ReconciledLine> lines(Statement statement, Map<String, BigDecimal> bill, Slack slack) {
        List<ReconciledLine> all = new ArrayList<>();
        if (bill.isEmpty()) {
            return all;
        }
        for (StatementLine line : statement.lines()) {
            Optional<BigDecimal> charged = Optional.ofNullable(bill.get(line.name()));
            boolean worthSaying =
                    charged.isPresent() || (!line.shownOnly() && line.amount().signum() != 0);
            if (worthSaying) {
                all.add(ReconciledLine.of(line.name(), charged, Optional.of(line.amount()), slack.line(line.name())));
            }
        }
        bill.forEach((name, amount) -> {
            if (statement.lines().stream().noneMatch(line -> line.name().equals(name))) {
                all.add(ReconciledLine.of(name, Optional.of(amount), Optional.empty(), BigDecimal.ZERO));
            }
        });
        return all;
    }

    private static boolean shownOnly(Statement statement, String name) {
        return statement.lines().stream()
                .anyMatch(line -> line.shownOnly() && line.name().equals(name));
    }

    private static BigDecimal sum(Stream<BigDecimal> amounts) {
        return amounts.reduce(BigDecimal.ZERO, BigDecimal::add);
    }
}
