// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.time.DayOfWeek;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.Month;
import java.time.ZoneId;
import java.util.BitSet;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.stream.LongStream;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import tariff.meter.DemandInterval;
import tariff.meter.IntervalSeries;
import tariff.meter.MeteredMonth;
import tariff.meter.MonthlySums;
import tariff.meter.Readings;
import tariff.meter.Register;
import tariff.meter.Window;
import tariff.meter.WindowCalendar;

/**
 * What a bank with a time switch and losses of its own does interval by interval lies within what the month's totals promise, register by
 * register, in the whole month and in each window. Own derivation of the bounds; loads, banks and hours from a seed.
 */
class BankMonthBoundsTest {
    private static final ZoneId ZONE = ZoneId.of("Europe/Berlin");
    private static final EnumSet<DayOfWeek> WORKDAYS = EnumSet.range(DayOfWeek.MONDAY, DayOfWeek.FRIDAY);
    private static final Map<String, Window> WINDOWS = Map.of(
            "day", Window.daily("07:00", "21:00").on(WORKDAYS),
            "night", Window.daily("23:00", "07:00"));
    private static final List<Optional<Window>> OFF = List.of(
            Optional.empty(),
            Optional.of(Window.daily("22:00", "06:00")),
            Optional.of(Window.daily("11:30", "13:15")),
            Optional.of(Window.daily("21:00", "05:00").on(WORKDAYS)),
            Optional.of(Window.daily("00:00", "00:00").on(EnumSet.of(DayOfWeek.SATURDAY, DayOfWeek.SUNDAY))),
            Optional.of(Window.daily("07:00", "06:00")),
            Optional.of(Window.daily("23:00", "07:00")),
            Optional.of(Window.daily("00:00", "00:00").in(EnumSet.of(Month.MARCH))));
    private static final List<Register> WORSE_IF_HIGHER = List.of(
            Register.LAGGING_KVARH,
            Register.LEADING_KVARH,
            Register.ENERGY_KWH,
            Register.PEAK_KW,
            Register.PEAK_KVA,
            Register.PEAK_LAGGING_KVAR,
            Register.PEAK_LEADING_KVAR);

    /** A peak is four times a quarter-hour, so the last digit of losses and roots shows four times: 0.0001 × 4, twice. */
    private static final BigDecimal METER_ROUNDING = new BigDecimal("0.001");

    static LongStream seeds() {
        return LongStream.rangeClosed(1, 40);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void theTruthLiesBetweenHighAndLow(long seed) {
        Random random = new Random(seed);
        IntervalSeries series = load(random);
        MonthlySums sums = new MonthlySums(
                series, new WindowCalendar(series, WINDOWS), DemandInterval.block(series.stepMinutes()), false);
        for (CapacitorBank shape : banks(random)) {
            for (Optional<Window> off : OFF) {
                CapacitorBank bank = off.map(shape::offIn).orElse(shape);
                BankYear truth = BankYear.of(sums, bank);
                BankMonth promised = new BankMonth(bank, WINDOWS, ZONE);
                for (MeteredMonth month : sums.months()) {
                    MeteredMonth low = promised.with(month, Estimate.LOW);
                    MeteredMonth central = promised.with(month, Estimate.CENTRAL);
                    MeteredMonth high = promised.with(month, Estimate.HIGH);
                    MeteredMonth exact = truth.month(month.period());
                    String what = bank + " in " + month.period();
                    within(what, exact.totals(), low.totals(), high.totals());
                    within(what, central.totals(), low.totals(), high.totals());
                    for (String name : WINDOWS.keySet()) {
                        within(
                                what + " " + name,
                                exact.windows().get(name),
                                low.windows().get(name),
                                high.windows().get(name));
                        within(
                                what + " " + name,
                                central.windows().get(name),
                                low.windows().get(name),
                                high.windows().get(name));
                    }
                }
            }
        }
    }

    private static void within(String what, Readings truth, Readings low, Readings high) {
        for (Register register : WORSE_IF_HIGHER) {
            assertThat(value(truth, register))
                    .as("%s of %s", register, what)
                    .isBetween(
                            value(high, register).subtract(METER_ROUNDING),
                            value(low, register).add(METER_ROUNDING));
        }
    }

    private static BigDecimal value(Readings readings, Register register) {
        return readings.get(register).orElse(BigDecimal.ZERO);
    }

    /** Fixed, switched in equal and unequal steps, and both; with losses. */
    private static List<CapacitorBank> banks(Random random) {
        String kvar = String.valueOf(5 + random.nextInt(200));
        BigDecimal watts = new BigDecimal(random.nextInt(60)).movePointLeft(1);
        Controller aims = Controller.aimingAt(new BigDecimal("0.97"));
        return Stream.of(
                        CapacitorBank.fixed(kvar),
                        CapacitorBank.automatic(kvar, kvar),
                        CapacitorBank.automatic(kvar, kvar, kvar).withController(aims),
                        CapacitorBank.automatic("5", kvar, String.valueOf(10 + random.nextInt(400))),
                        CapacitorBank.plain(new BigDecimal(kvar), List.of(new BigDecimal(kvar)))
                                .withController(aims))
                .map(bank -> bank.withLosses(watts))
                .toList();
    }

    /** Quarter-hours of March and April, the clock put forward between: base load, shifts, and machines that are on or not. */
    private static IntervalSeries load(Random random) {
        LocalDate first = LocalDate.of(2025, 3, 1);
        long from = first.atStartOfDay(ZONE).toEpochSecond();
        int size = (int) ((LocalDate.of(2025, 5, 1).atStartOfDay(ZONE).toEpochSecond() - from) / 900);
        long[] kwh = new long[size];
        long[] lagging = new long[size];
        long[] leading = new long[size];
        int base = random.nextInt(80_000);
        int shift = random.nextInt(600_000);
        int machine = random.nextInt(400_000);
        int begins = random.nextInt(24);
        int hours = 1 + random.nextInt(18);
        boolean leadsAtRest = random.nextInt(3) == 0;
        for (int i = 0; i < size; i++) {
            LocalDateTime at = LocalDateTime.ofEpochSecond(from + 900L * i, 0, java.time.ZoneOffset.UTC);
            boolean works = (at.getHour() + 24 - begins) % 24 < hours;
            long load = base + (works ? shift : 0) + (random.nextInt(6) == 0 ? machine : 0);
            kwh[i] = load + random.nextInt(20_000);
            boolean leads = leadsAtRest && !works && random.nextBoolean();
            lagging[i] = leads ? 0 : load * 3 / 4 + random.nextInt(20_000);
            leading[i] = leads ? random.nextInt(50_000) : 0;
        }
        return new IntervalSeries(
                first.atStartOfDay(ZONE).toInstant(),
                15,
                ZONE,
                4,
                kwh,
                lagging,
                leading,
                Optional.empty(),
                new BitSet());
    }
}
