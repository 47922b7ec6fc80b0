// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;
import tariff.chart.Sheet.Anchor;
import tariff.chart.Sheet.Heading;

/**
 * A bill by its lines: a column for each month, a layer for each line, and hatched on each layer what of it is paid because of reactive
 * load. Credits hang below the line of nothing. Of more than eight lines the smallest are drawn as one.
 *
 * @param title over the chart
 * @param currency of all amounts
 * @param months a short name for each column, at least one
 * @param lines the layers, from the bottom up
 */
public record BillChart(String title, String currency, List<String> months, List<Layer> lines) {
    private static final double WIDTH = 920;
    private static final double PLOT_HEIGHT = 320;
    private static final double LEGEND_WIDTH = 250;
    private static final double WIDEST_COLUMN = 56;

    /**
     * One line of the bill.
     *
     * @param name of the line
     * @param amounts for each month; below zero for a credit
     * @param reactive what of each amount is paid because of reactive load
     */
    public record Layer(String name, List<Double> amounts, List<Double> reactive) {
        public Layer {
            amounts = List.copyOf(amounts);
            reactive = List.copyOf(reactive);
            Numbers.check(name, amounts);
            Numbers.check(name, reactive);
        }

        double total() {
            return amounts.stream().mapToDouble(Double::doubleValue).sum();
        }

        double totalReactive() {
            return reactive.stream().mapToDouble(Double::doubleValue).sum();
        }

        private double size() {
            return amounts.stream().mapToDouble(Math::abs).sum();
        }

        private Layer plus(Layer other) {
            return new Layer("Other lines", sums(amounts, other.amounts), sums(reactive, other.reactive));
        }

        private static List<Double> sums(List<Double> some, List<Double> others) {
            return IntStream.range(0, some.size())
                    .mapToObj(i -> some.get(i) + others.get(i))
                    .toList();
        }
    }

    /** Throws {@link IllegalArgumentException} if there is no month, or a line lacks one. */
    public BillChart {
        months = List.copyOf(months);
        if (months.isEmpty()) {
            throw new IllegalArgumentException("a chart of bills needs at least one month");
        }
        for (Layer line : lines) {
            if (line.amounts().size() != months.size() || line.reactive().size() != months.size()) {
                throw new IllegalArgumentException(
                        line.name() + " has " + line.amounts().size() + " amounts and "
                                + line.reactive().size() + " reactive parts for " + months.size() + " months");
            }
        }
        lines = fewEnough(List.copyOf(lines));
    }

    private static List<Layer> fewEnough(List<Layer> lines) {
        if (lines.size() <= Ink.count()) {
            return lines;
        }
        List<Layer> largest = lines.stream()
                .sorted(Comparator.comparingDouble(Layer::size).reversed())
                .limit(Ink.count() - 1)
                .toList();
        List<Layer> drawn =
                new ArrayList<>(lines.stream().filter(largest::contains).toList());
        lines.stream()
                .filter(line -> !largest.contains(line))
                .reduce(Layer::plus)
                .ifPresent(drawn::add);
        return List.copyOf(drawn);
    }

    /** The chart as an SVG file. */
    public String svg() {
        Heading heading = new Heading(title, currency + " each month, by line of the bill");
        BillLegend legend = new BillLegend(lines, LEGEND_WIDTH);
        double top = heading.bottom(WIDTH) + 10;
        double bottom = top + Math.max(PLOT_HEIGHT, legend.height());
        Axis y = Axis.holding(lowest(), highest(), 6);
        double right = WIDTH - Sheet.MARGIN - LEGEND_WIDTH - 16;
        Frame frame = new Frame(Frame.leftOf(y), top, right, bottom, Axis.whole(0, months.size(), 12), y);
        Sheet sheet = new Sheet("bill", heading, description(), WIDTH, bottom + 34);
        Patterns patterns = new Patterns(sheet, lines.size());
        frame.drawY(sheet);
        for (int month = 0; month < months.size(); month++) {
            column(sheet, frame, patterns, month);
        }
        monthNames(sheet, frame);
        legend.draw(sheet, patterns, right + 16, top);
        return sheet.finish();
    }

    private void column(Sheet sheet, Frame frame, Patterns patterns, int month) {
        double width = Math.min(WIDEST_COLUMN, slot(frame) * 0.76);
        double x = middle(frame, month) - width / 2;
        double up = 0;
        double down = 0;
        for (int i = 0; i < lines.size(); i++) {
            double amount = lines.get(i).amounts().get(month);
            if (amount == 0) {
                continue;
            }
            double from = amount > 0 ? up : down;
            double part = Math.min(Math.max(0, lines.get(i).reactive().get(month)), Math.max(0, amount));
            sheet.svg.open("g");
            sheet.svg.text(words(lines.get(i), month), "title");
            bar(sheet, frame, x, width, from, from + amount, patterns.area(i));
            if (part > 0) {
                bar(sheet, frame, x, width, from + amount - part, from + amount, patterns.hatch());
            }
            sheet.svg.close();
            up = amount > 0 ? up + amount : up;
            down = amount > 0 ? down : down + amount;
        }
    }

    private static void bar(Sheet sheet, Frame frame, double x, double width, double from, double to, String fill) {
        double high = frame.atY(Math.max(from, to));
        sheet.rect(x, high, width, frame.atY(Math.min(from, to)) - high, fill, Ink.TEXT);
    }

    private String words(Layer line, int month) {
        return months.get(month) + ", " + line.name() + ": "
                + Numbers.money(line.amounts().get(month)) + ", of which because of reactive load "
                + Numbers.money(line.reactive().get(month));
    }

    private void monthNames(Sheet sheet, Frame frame) {
        double widest = Lettering.widest(months, Lettering.PLAIN);
        int every = Frame.every(months.size(), widest, slot(frame));
        for (int month = 0; month < months.size(); month += every) {
            sheet.text(middle(frame, month), frame.bottom() + 20, Lettering.PLAIN, Anchor.MIDDLE, months.get(month));
        }
    }

    private double slot(Frame frame) {
        return (frame.right() - frame.left()) / months.size();
    }

    private double middle(Frame frame, int month) {
        return frame.left() + (month + 0.5) * slot(frame);
    }

    private double highest() {
        return IntStream.range(0, months.size())
                .mapToDouble(month -> lines.stream()
                        .mapToDouble(line -> Math.max(0, line.amounts().get(month)))
                        .sum())
                .max()
                .orElse(0);
    }

    private double lowest() {
        return IntStream.range(0, months.size())
                .mapToDouble(month -> lines.stream()
                        .mapToDouble(line -> Math.min(0, line.amounts().get(month)))
                        .sum())
                .min()
                .orElse(0);
    }

    private String description() {
        StringBuilder words = new StringBuilder("Stacked columns from " + months.get(0) + " to "
                + months.get(months.size() - 1) + " in " + currency + ".");
        for (Layer line : lines) {
            words.append(' ')
                    .append(line.name())
                    .append(": ")
                    .append(Numbers.money(line.total()))
                    .append(", because of reactive load ")
                    .append(Numbers.money(line.totalReactive()))
                    .append('.');
        }
        return words.toString();
    }
}
