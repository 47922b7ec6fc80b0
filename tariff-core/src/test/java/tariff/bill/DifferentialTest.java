// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;
import tariff.json.JsonTree;
import tariff.json.RateFile;
import tariff.meter.MeteredMonth;
import tariff.meter.Period;
import tariff.meter.Readings;
import tariff.meter.Register;
import tariff.meter.Site;
import tariff.meter.Unit;
import tariff.rate.Rate;
import tariff.rate.clause.QuantityKinds;

/** The engine and a second, naive evaluator agree on every line of 10,000 months, under 2,000 rates drawn at random. */
class DifferentialTest {
    private static final int RATES = 2_000;
    private static final Map<String, BigDecimal> AGREED = Map.of("kW", new BigDecimal("450"));

    @Test
    @SuppressWarnings("unchecked")
    void bothAgreeToTheCentOnEveryLine() {
        Set<String> kinds = new LinkedHashSet<>();
        int compared = 0;
        for (int seed = 0; seed < RATES; seed++) {
            RandomRates random = new RandomRates(seed);
            String json = random.rate();
            List<NaiveBill.Month> months = random.months();
            Map<String, Object> map = (Map<String, Object>) JsonTree.read(json.getBytes(StandardCharsets.UTF_8));
            Rate rate = RateFile.parse(json);
            QuantityKinds.keys().stream()
                    .filter(key -> json.contains("\"" + key + "\""))
                    .forEach(kinds::add);
            List<Statement> statements = new Billing(rate, new Site("", Map.of(Unit.KW, AGREED.get("kW")), Set.of()))
                    .statements(months.stream().map(DifferentialTest::metered).toList());
            for (int i = 0; i < months.size(); i++) {
                Map<String, BigDecimal> naive = new NaiveBill(map, AGREED, months, i).bill();
                Statement statement = statements.get(i);
                for (StatementLine line : statement.lines()) {
                    same(line.amount(), naive.get(line.name()), seed, line.name() + " of month " + i, json);
                }
                same(statement.total(), naive.get(""), seed, "total of month " + i, json);
                compared++;
            }
        }
        assertThat(compared).isEqualTo(10_000);
        List<String> monthly = new ArrayList<>(QuantityKinds.keys());
        monthly.remove("each");
        assertThat(kinds).containsAll(monthly);
    }

    /** Equal, or apart by less than anybody can bill where a rate does not round its lines: divisions keep 34 digits. */
    private static void same(BigDecimal engine, BigDecimal naive, int seed, String what, String json) {
        assertThat(engine.subtract(naive).abs())
                .as("seed %s, %s: engine %s, naive %s%n%s", seed, what, engine, naive, json)
                .isLessThan(new BigDecimal("1e-15"));
    }

    static MeteredMonth metered(NaiveBill.Month month) {
        Readings totals = Readings.none();
        Readings day = Readings.none();
        for (Register register : Register.values()) {
            BigDecimal total = month.figures().get(register.key());
            BigDecimal inDay = month.figures().get("day/" + register.key());
            totals = total == null ? totals : totals.with(register, total);
            day = inDay == null ? day : day.with(register, inDay);
        }
        return new MeteredMonth(new Period(month.first(), month.last()), totals).withWindow("day", day);
    }
}
