// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import tariff.chart.TornadoChart;
import tariff.notice.Refusal;
import tariff.payback.PresentValue;
import tariff.payback.Sensitivity;
import tariff.payback.Venture;

/** How far the net present value moves when one input at a time is a fifth lower or higher than thought. */
final class WhatItHangsOn {
    private static final BigDecimal FIFTH = new BigDecimal("0.2");
    private static final String MEASURE = "net present value, ";

    private WhatItHangsOn() {}

    static void write(Html page, Report report, Venture venture) {
        Optional<BigDecimal> expected = PresentValue.netOfYears(venture).optional();
        List<Sensitivity> moved = moved(venture);
        if (expected.isEmpty() || moved.isEmpty()) {
            return;
        }
        page.text("h3", "What the verdict hangs on");
        page.paragraph(
                "One input at a time is taken a fifth lower and a fifth higher, all others as they are; central estimate.");
        TornadoChart chart = new TornadoChart(
                "What the verdict hangs on",
                MEASURE + report.currency(),
                "20 % lower",
                "20 % higher",
                expected.get().doubleValue(),
                moved.stream().map(WhatItHangsOn::bar).toList());
        Drawing.write(page, "tornado-chart", "Net present value when one input is off by a fifth.", chart.svg());
        Table table = new Table(
                "payback-tornado",
                "Net present value in " + report.currency() + "; as expected " + Shown.money(expected.get()),
                List.of("Input", "20 % lower", "20 % higher", "Between the two"));
        for (Sensitivity each : moved) {
            table.row(
                    Shown.word(each.driver()),
                    Shown.money(each.low().netPresentValue()),
                    Shown.money(each.high().netPresentValue()),
                    Shown.money(each.swing()));
        }
        table.write(page);
    }

    private static TornadoChart.Bar bar(Sensitivity each) {
        return new TornadoChart.Bar(
                Shown.word(each.driver()),
                each.low().netPresentValue().doubleValue(),
                each.high().netPresentValue().doubleValue());
    }

    /** None without a discount rate, nor where a fifth more of an input is more than it may be; inputs of 0 do not move. */
    private static List<Sensitivity> moved(Venture venture) {
        try {
            return Sensitivity.of(venture, FIFTH).optional().orElse(List.of()).stream()
                    .filter(each -> each.swing().signum() > 0)
                    .toList();
        } catch (Refusal outOfRange) {
            return List.of();
        }
    }
}
