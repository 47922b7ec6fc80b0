// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import tariff.bill.Statement;
import tariff.bill.StatementLine;
import tariff.json.JsonObject;
import tariff.json.NoticeJson;
import tariff.json.StatementsJson;
import tariff.notice.Assumption;
import tariff.rate.Rate;
import tariff.rate.clause.Figure;

/**
 * Statements, printed.
 *
 * @param more what was taken to be so besides what the statements say
 */
record StatementAnswer(Rate rate, List<Statement> statements, List<Assumption> more) implements Format.Printable {

    @Override
    public String text() {
        StringBuilder out = new StringBuilder(Wrapped.text(rate.name() + ", amounts in " + rate.currency()));
        for (Statement statement : statements) {
            out.append('\n').append(statement.month().period()).append('\n').append(month(statement));
        }
        List<String> assumptions = Assumed.text(
                Stream.concat(more.stream(), statements.stream().flatMap(each -> each.assumptions().stream()))
                        .toList());
        if (!assumptions.isEmpty()) {
            out.append("\nTaken to be so\n");
            assumptions.forEach(each -> out.append(Wrapped.text("- " + each)));
        }
        return out.toString();
    }

    /** Amounts under each other, and the working beside each where it fits. */
    private static String month(Statement statement) {
        Table table = new Table();
        statement
                .lines()
                .forEach(line -> table.row(
                        "  " + line.name() + (line.shownOnly() ? " (shown only)" : ""),
                        line.amount().toPlainString()));
        String[] rows =
                table.row("  Total", statement.total().toPlainString()).text().split("\n", -1);
        List<String> out = new ArrayList<>();
        for (int i = 0; i < statement.lines().size(); i++) {
            String working = "  " + working(statement.lines().get(i));
            out.add(rows[i] + (rows[i].length() + working.length() <= Wrapped.WIDTH ? working : ""));
        }
        out.add(rows[statement.lines().size()]);
        return String.join("\n", out).replaceAll(" +\n", "\n") + "\n";
    }

    private static String working(StatementLine line) {
        return line.derivation().map(Figure::working).map(text -> "= " + text).orElse("does not apply");
    }

    @Override
    public JsonObject json() {
        JsonObject json = StatementsJson.write(rate, statements);
        return more.isEmpty() ? json : json.withAll("assumptions", more, NoticeJson::write);
    }

    @Override
    public String csv() {
        Csv csv = new Csv(List.of("from", "to", "line", "amount", "in total", "currency"));
        for (Statement statement : statements) {
            for (StatementLine line : statement.lines()) {
                csv.row(List.of(
                        statement.month().period().first().toString(),
                        statement.month().period().last().toString(),
                        line.name(),
                        line.amount().toPlainString(),
                        line.shownOnly() ? "no" : "yes",
                        statement.currency()));
            }
        }
        return csv.text();
    }
}
