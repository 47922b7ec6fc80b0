// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.io.ByteArrayOutputStream;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.time.YearMonth;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import java.util.stream.Collectors;
import tariff.meter.MeteredMonth;
import tariff.meter.Period;
import tariff.meter.Readings;
import tariff.meter.Register;

/** A generated year of bills, written down the way some person might. */
record WrittenYear(List<MeteredMonth> months, byte[] bytes, String text) {
    private static final List<Register> REGISTERS = List.of(
            Register.ENERGY_KWH,
            Register.LAGGING_KVARH,
            Register.LEADING_KVARH,
            Register.PEAK_KW,
            Register.POWER_FACTOR);
    private static final List<String> NAMES =
            List.of("Month", "Energy (kWh)", "Lagging kvarh", "Leading kvarh", "Max demand kW", "PF");

    static WrittenYear of(long seed) {
        Random random = new Random(seed);
        List<MeteredMonth> months = months(random);
        char separator = ";,\t|".charAt(random.nextInt(4));
        char decimal = ".,".charAt(random.nextInt(2));
        String thousands = pick(random, "", decimal == '.' ? "," : ".", " ", "\u00a0", "\u202f", "'", "’");
        int dates = random.nextInt(6);
        List<List<String>> table = new ArrayList<>();
        table.add(NAMES);
        List<MeteredMonth> written = new ArrayList<>(months);
        if (random.nextBoolean()) {
            Collections.reverse(written);
        }
        for (MeteredMonth month : written) {
            List<String> row = new ArrayList<>(List.of(date(month.period(), dates)));
            for (Register register : REGISTERS) {
                row.add(month.totals()
                        .get(register)
                        .map(value -> number(value, decimal, thousands))
                        .orElse(pick(random, "", "-", "n/a")));
            }
            table.add(row);
        }
        if (random.nextBoolean()) {
            table.add(List.of("Total", number(new BigDecimal("12345678.5"), decimal, thousands), "", "", "", ""));
        }
        if (random.nextBoolean()) {
            table = turned(table);
        }
        if (random.nextBoolean()) {
            table.add(0, List.of("Bills of the mill", "kept by the office"));
            table.add(1, List.of());
        }
        String text = table.stream()
                .map(row -> row.stream()
                        .map(cell -> quoted(cell, separator))
                        .collect(Collectors.joining(String.valueOf(separator))))
                .collect(Collectors.joining(pick(random, "\n", "\r\n"), "", "\n"));
        return new WrittenYear(months, encoded(text, random.nextInt(5)), text);
    }

    private static List<MeteredMonth> months(Random random) {
        List<MeteredMonth> months = new ArrayList<>();
        YearMonth first = YearMonth.of(2020 + random.nextInt(7), 1 + random.nextInt(12));
        for (int i = 0; i < 12; i++) {
            Readings readings = Readings.none()
                    .with(Register.ENERGY_KWH, decimal(random, 2_000_000, random.nextInt(4)))
                    .with(Register.LAGGING_KVARH, decimal(random, 1_000_000, random.nextInt(4)))
                    .with(Register.POWER_FACTOR, BigDecimal.valueOf(700 + random.nextInt(301), 3));
            if (random.nextBoolean()) {
                readings = readings.with(Register.PEAK_KW, decimal(random, 5_000, 1));
            }
            if (random.nextInt(4) == 0) {
                readings = readings.with(Register.LEADING_KVARH, decimal(random, 5_000, 0));
            }
            months.add(new MeteredMonth(Period.of(first.plusMonths(i)), readings));
        }
        return months;
    }

    private static BigDecimal decimal(Random random, int below, int places) {
        return BigDecimal.valueOf(random.nextDouble() * below).setScale(places, RoundingMode.HALF_UP);
    }

    private static String date(Period period, int kind) {
        YearMonth month = period.month();
        return switch (kind) {
            case 0 -> month.toString();
            case 1 -> String.format(Locale.ROOT, "%02d/%d", month.getMonthValue(), month.getYear());
            case 2 ->
                month.getMonth().getDisplayName(java.time.format.TextStyle.FULL, Locale.GERMAN) + " " + month.getYear();
            case 3 -> period.first().toString();
            case 4 -> String.format(Locale.ROOT, "01.%02d.%d", month.getMonthValue(), month.getYear());
            default ->
                String.format(
                        Locale.ROOT,
                        "%02d/%02d/%d",
                        period.last().getDayOfMonth(),
                        month.getMonthValue(),
                        month.getYear());
        };
    }

    private static String number(BigDecimal value, char decimal, String thousands) {
        String plain = value.toPlainString();
        int at = plain.indexOf('.') < 0 ? plain.length() : plain.indexOf('.');
        StringBuilder whole = new StringBuilder(plain.substring(0, at));
        for (int i = whole.length() - 3; i > 0; i -= 3) {
            whole.insert(i, thousands);
        }
        return whole + plain.substring(at).replace('.', decimal);
    }

    private static List<List<String>> turned(List<List<String>> table) {
        List<List<String>> turned = new ArrayList<>();
        for (int column = 0; column < table.get(0).size(); column++) {
            int at = column;
            turned.add(table.stream().map(row -> row.get(at)).toList());
        }
        return turned;
    }

    private static String quoted(String cell, char separator) {
        return cell.indexOf(separator) >= 0 ? "\"" + cell + "\"" : cell;
    }

    private static byte[] encoded(String text, int kind) {
        Charset windows = Charset.forName("windows-1252");
        boolean fits = windows.newEncoder().canEncode(text);
        return switch (kind) {
            case 0 -> ("\ufeff" + text).getBytes(StandardCharsets.UTF_8);
            case 1 -> ("\ufeff" + text).getBytes(StandardCharsets.UTF_16LE);
            case 2 -> ("\ufeff" + text).getBytes(StandardCharsets.UTF_16BE);
            case 3 -> text.getBytes(fits ? windows : StandardCharsets.UTF_8);
            default -> text.getBytes(StandardCharsets.UTF_8);
        };
    }

    /** The same bytes with a few of them changed, doubled or lost. */
    byte[] damaged(Random random) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        int one = 1 + random.nextInt(bytes.length);
        for (byte each : bytes) {
            int kind = random.nextInt(one) == 0 ? random.nextInt(4) : 3;
            if (kind > 0) {
                out.write(kind == 1 ? "\";,.-#\t|'%E0\n".charAt(random.nextInt(13)) : each);
            }
            if (kind == 2) {
                out.write(each);
            }
        }
        return out.toByteArray();
    }

    private static String pick(Random random, String... choices) {
        return choices[random.nextInt(choices.length)];
    }
}
