// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import tariff.service.http.Examples;

/** Every rate on the shelf checks, and bills its example year to the byte as its statement says. A new rate needs a statement. */
class ShelfStatementsTest {
    /** It counts inside each hour, which monthly bills do not hold. */
    private static final Set<String> NEEDS_INTERVALS = Set.of("ilha-verde-hourly");

    /** The sheet itself jumps there: another price for the same kvarh below and from power factor 0.95 on. */
    private static final Map<String, String> WARNINGS = Map.of("costa-brisa-three-periods", """
            /lines/4/price/bySchedule: jumps from 0.041554 to 0 between power factor 0.9499 and 0.95, the largest of 2 jumps
            /lines/5/price/bySchedule: jumps from 0.041554 to 0 between power factor 0.9499 and 0.95, the largest of 2 jumps
            """);

    static Stream<String> shelf() {
        return Examples.rates().stream()
                .map(file -> String.valueOf(file.getFileName()).replace(".json", ""));
    }

    static Stream<String> billed() {
        return shelf().filter(id -> !NEEDS_INTERVALS.contains(id));
    }

    private static Path rate(String id) {
        return Examples.path("examples/rates/" + id + ".json");
    }

    private static Path statement(String id) {
        return Examples.path("examples/statements/" + id + ".csv");
    }

    private static Path bills(String id) {
        Path own = Examples.path("examples/bills/" + id + ".json");
        return Files.exists(own) ? own : Examples.path("examples/foundry/bills.json");
    }

    @ParameterizedTest
    @MethodSource("shelf")
    void everyRateChecks(String id) {
        Printed ran = Printed.by("check", rate(id));
        assertThat(ran.exit()).isEqualTo(Exit.OK);
        assertThat(ran.err()).isEqualTo(WARNINGS.getOrDefault(id, ""));
    }

    @ParameterizedTest
    @MethodSource("billed")
    void everyRateBillsItsYearAsItsStatementSays(String id) {
        Printed ran = Printed.by("statement", rate(id), bills(id), "--format", "csv");
        assertThat(ran.exit()).isEqualTo(Exit.OK);
        assertThat(ran.out()).isEqualTo(Examples.read(statement(id)));
    }

    @ParameterizedTest
    @MethodSource("billed")
    void everyStatementHoldsAYear(String id) {
        assertThat(Examples.read(statement(id))
                        .lines()
                        .skip(1)
                        .map(row -> row.substring(0, 7))
                        .distinct())
                .hasSize(12);
    }

    @Test
    void everyStatementAndEveryBillHasItsRate() {
        assertThat(names("examples/statements").filter(name -> name.endsWith(".csv")))
                .containsExactlyInAnyOrderElementsOf(
                        billed().map(id -> id + ".csv").toList());
        assertThat(names("examples/bills").map(name -> name.replace(".json", "")))
                .isSubsetOf(shelf().toList());
    }

    private static Stream<String> names(String directory) {
        return Stream.of(java.util.Objects.requireNonNull(
                Examples.path(directory).toFile().list()));
    }

    /** One month of each, own arithmetic beside the row, from the rate's clause and the month's figures alone. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                // 101,090 kWh, 75,220 kvarh: √(101,090² + 75,220²) = 126,003.8; 101,090 ÷ 126,003.8 = 0.8023.
                // 93 − 80.23 = 12.77 points of 1 %. 8,552,214 × 0.1277 = 1,092,117.7
                "andes-norte-at4           | 2025-01 | Energy                 | 8552214", // 101,090 × 84.6 =
                // 8,552,214.0
                "andes-norte-at4           | 2025-01 | Demand                 | 2620100", // 266 × 9,850
                "andes-norte-at4           | 2025-01 | Low power factor       | 1092118",
                "andes-norte-at4           | 2025-01 | Value added tax        | 2330487", // × 0.19
                // 207,290 kWh, 157,870 kvarh: power factor 0.7956, so 0.80. 85 − 80 = 5 points of 1.5 % = 7.5 %.
                "bukit-emas-medium         | 2025-01 | Energy                 | 75660.85", // 207,290 × 0.365
                "bukit-emas-medium         | 2025-01 | Maximum demand         | 16872.00", // 570 × 29.60
                "bukit-emas-medium         | 2025-01 | Power factor surcharge | 6939.96", // 92,532.85 × 0.075 =
                // 6,939.964
                "bukit-emas-medium         | 2025-01 | Renewables fund        | 1480.53", // 92,532.85 × 0.016 =
                // 1,480.526
                // 93,930 kWh, 62,650 kvarh: power factor 0.83193. 97 − 83.193 = 13.807 points, the broken one more
                // than half: 14. (273 − 50) × 1.14 = 254.22 kW
                "cedar-bluff-general       | 2025-01 | Demand                 | 1995.63", // 254.22 × 7.85 = 1,995.627
                // 20 % of 258,100 = 51,620 < 61,990 and 15 % = 38,715 < 43,036: both are charged whole.
                "kara-liman-cliff          | 2025-01 | Inductive energy       | 73606.93", // 61,990 × 1.1874 =
                // 73,606.926
                "kara-liman-cliff          | 2025-01 | Capacitive energy      | 51100.95", // 43,036 × 1.1874 =
                // 51,100.946
                // 0.95 × 2,543 kVA = 2,415.85 is more than 2,280 kW; × 31 ÷ 30 = 2,496.378
                "laurent-bay-large-power   | 2025-01 | Demand                 | 34250.31", // × 13.72 = 34,250.311
                // The highest 462 kVA is below the agreed 520. 33 % of 140,020 = 46,206.6; 80,660 − 46,206.6 = 34,453.4
                "northmoor-capacity        | 2025-01 | Fixed charge           | 13.05", // 31 × 0.4210 = 13.051
                "northmoor-capacity        | 2025-01 | Capacity               | 419.12", // 520 × 31 × 0.0260
                "northmoor-capacity        | 2025-01 | Reactive power         | 155.04", // 34,453.4 × 0.0045 = 155.0403
                // 0.6197 × 553 = 342.694; 450 − 342.694 = 107.306, so 107 kvar
                "pak-nam-bay               | 2025-01 | Power factor charge    | 5999.49", // 107 × 56.07
                // 62 % of 371,830 = 230,534.6; 244,810 − 230,534.6 = 14,275.4; nothing was fed in
                "polder-grid-mv            | 2025-01 | Reactive energy        | 85.65", // 14,275.4 × 0.0060 = 85.652
                "polder-grid-mv            | 2025-01 | Reactive energy sent   | 6.04", // 1,006 × 0.0060 = 6.036
                // 149,850 kWh, 113,860 kvarh: power factor 0.7962, so 0.80; 0.90 ÷ 0.80 − 1 = 12.5 %
                "song-lam-production       | 2025-01 | Energy                 | 262087650", // 149,850 × 1,749
                "song-lam-production       | 2025-01 | Reactive energy        | 32760956", // × 0.125 = 32,760,956.25
                // half of 140,790 = 70,395; 90,480 − 70,395 = 20,085. Half of 67,390 = 33,695; 47,440 − 33,695 = 13,745
                "talwerke-netz             | 2025-01 | Reactive energy by day   | 194.82", // 20,085 × 0.0097 = 194.8245
                "talwerke-netz             | 2025-01 | Reactive energy by night | 34.36", // 13,745 × 0.0025 = 34.3625
                // 96,460 + 23,370 = 119,830 kWh, 57,760 + 13,990 = 71,750 kvarh, under 75 % (89,872.5).
                // 71,750 − 0.33 × 119,830 = 32,206.1
                "valmarina-bands           | 2025-01 | Reactive energy        | 276.97", // 32,206.1 × 0.0086 = 276.972
                "valmarina-bands           | 2025-01 | Sent back at night     | 8.28", // 490 × 0.01689 = 8.276
                // 95 − 88.3 = 6.7 points of 2 % = 13.4 %; 472 × 1.134 = 535.248 kW. 200 h × 535.248 = 107,049.6 kWh
                "wheat-ridge-power         | 2025-01 | Demand                 | 5352.48", // × 10
                // 107,049.6 × 0.077 + 58,560.4 × 0.051 = 8,242.819 + 2,986.580
                "wheat-ridge-power         | 2025-01 | Energy                 | 11229.40"
            })
    void aMonthIsWorkedOutWithAPencil(String id, String month, String line, String amount) {
        assertThat(Examples.read(statement(id)).lines())
                .anyMatch(row -> row.startsWith(month) && row.contains("," + line + "," + amount + ","));
    }
}
