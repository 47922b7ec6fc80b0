// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import tariff.meter.MeteredMonth;
import tariff.meter.Register;

class CausePropertiesTest {
    private static final String[] ROUND = {
        "",
        ", 'round': { 'to': 0.01, 'mode': 'halfUp' }",
        ", 'round': { 'to': 0.001, 'mode': 'halfUp' }",
        ", 'round': { 'to': 0.01, 'mode': 'down' }"
    };
    private static final String[] LEADING = {"ignored", "added", "netted"};
    private static final String[] POINTS = {"exact", "started", "completed", "majorFraction"};
    private static final String[] DEMAND = {
        "'to': 1, 'mode': 'halfUp'", "'to': 1, 'mode': 'up'", "'to': 1, 'mode': 'down'", "'to': 0.1, 'mode': 'halfUp'"
    };
    private static final String[] PEAK = {"kW", "kVA"};
    private static final String[] TAX = {"", ", { 'name': 'Tax', 'percentOf': 'all above', 'percent': 7 }"};

    private static final String[] CODES = {
        "power-factor-rounding", "leading-kvarh", "point-count", "demand-rounding", "demand-register", "line-left-out"
    };

    /** A choice for each of the parts above, in their order. */
    private static String rate(int[] choice, double slope) {
        return """
                { 'name': 'Any', 'currency': 'EUR',
                  'powerFactors': { 'billing': { 'from': 'energies', 'leading': '%s'%s } },
                  'lines': [
                    { 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'price': 0.1017 },
                    { 'name': 'Demand', 'quantity': { 'rounded': { 'peak': '%s' }, %s }, 'price': 9.83 },
                    { 'name': 'Surcharge', 'percentOf': [ 'Energy', 'Demand' ], 'schedule': { 'powerFactor': 'billing',
                        'slopes': [ { 'below': 0.95, 'perPoint': %s } ], 'points': '%s' } }%s ] }""".formatted(
                        LEADING[choice[1]],
                        ROUND[choice[0]],
                        PEAK[choice[4]],
                        DEMAND[choice[3]],
                        slope,
                        POINTS[choice[2]],
                        TAX[choice[5]]);
    }

    @Test
    void whateverTheUtilityDidOtherwiseIsAmongTheBestExplanations() {
        Random random = new Random(20260117);
        int[] sizes = {ROUND.length, LEADING.length, POINTS.length, DEMAND.length, PEAK.length, TAX.length};
        int told = 0;
        for (int run = 0; run < 60; run++) {
            int[] printed = new int[sizes.length];
            for (int i = 0; i < sizes.length; i++) {
                printed[i] = random.nextInt(sizes[i]);
            }
            int cause = random.nextInt(sizes.length);
            printed[5] = cause == 5 ? 1 : printed[5];
            int[] done = printed.clone();
            done[cause] = (printed[cause] + 1 + random.nextInt(sizes[cause] - 1)) % sizes[cause];
            double slope = (1 + random.nextInt(30)) / 20.0;
            List<MeteredMonth> months = PaidBills.charged(rate(done, slope), PaidBills.year(run));
            Reconciliation found = CauseTest.reconcile(rate(printed, slope), months);
            if (found.agreement().toTheCent() < 12) {
                told++;
                assertThat(found.explanations())
                        .as("%s billed as %s", rate(printed, slope), rate(done, slope))
                        .anySatisfy(each -> {
                            assertThat(each.code()).isEqualTo(CODES[cause]);
                            assertThat(each.then().toTheCent()).isEqualTo(12);
                        });
            }
        }
        assertThat(told).isGreaterThan(40);
    }

    @Test
    void aSlipOfThePenInAnyMonthIsAmongTheBestExplanations() {
        Random random = new Random(20260118);
        Register[] registers = {Register.ENERGY_KWH, Register.LAGGING_KVARH, Register.PEAK_KW};
        int told = 0;
        for (int run = 0; run < 60; run++) {
            int place = random.nextInt(12);
            Register register = registers[random.nextInt(registers.length)];
            List<MeteredMonth> real = PaidBills.year(run);
            MeteredMonth month = real.get(place);
            List<MeteredMonth> slips = new ArrayList<>();
            Digits.swapped(month.totals().get(register).orElseThrow())
                    .forEach(slip -> slips.add(month.with(month.totals().with(register, slip))));
            List<MeteredMonth> given = PaidBills.with(real, place, slips.get(random.nextInt(slips.size())));
            Reconciliation found = CauseTest.reconcile(PaidBills.RATE, PaidBills.charged(PaidBills.RATE, given, real));
            if (found.agreement().agreeing() < 12) {
                told++;
                assertThat(found.explanations())
                        .as("run %s: %s in %s", run, register, month.period())
                        .anySatisfy(each -> assertThat(each.code()).isEqualTo("digits-swapped"));
            }
        }
        assertThat(told).isGreaterThan(30);
    }
}
