// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import java.math.BigDecimal;
import java.util.List;
import tariff.bill.Statement;
import tariff.bill.StatementLine;
import tariff.rate.Rate;

/** Statements, each line with its derivation. */
public final class StatementsJson {
    private StatementsJson() {}

    /**
     * Statements under one rate.
     *
     * @param statements the earliest first
     */
    public static JsonObject write(Rate rate, List<Statement> statements) {
        BigDecimal total = statements.stream().map(Statement::total).reduce(BigDecimal.ZERO, BigDecimal::add);
        return new JsonObject()
                .with("rate", rate.name())
                .with("currency", rate.currency())
                .with("total", total)
                .withAll("statements", statements, StatementsJson::write);
    }

    private static JsonObject write(Statement statement) {
        return PeriodJson.write(new JsonObject(), statement.month().period())
                .with("total", statement.total())
                .withAll("lines", statement.lines(), StatementsJson::write)
                .withAll("assumptions", statement.assumptions(), NoticeJson::write);
    }

    private static JsonObject write(StatementLine line) {
        JsonObject json = new JsonObject().with("name", line.name()).with("amount", line.amount());
        line.derivation().ifPresent(figure -> json.with("derivation", FigureJson.write(figure)));
        return line.shownOnly() ? json.with("shownOnly", true) : json;
    }
}
