// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tariff.meter.Unit;
import tariff.notice.Assumption;

/**
 * A price for each part of a quantity. A block's upper edge is itself a quantity, so that kvarh above a share of the kWh, energy by
 * hours of use, and demand over the contract are one thing: {@code "blocks": [ { "upTo": { "share": 0.33, "of": { "energy": "kWh" } },
 * "price": 0 }, { "price": 0.042 } ]}.
 */
record Blocks(List<Block> blocks) implements Price {

    /**
     * A part of a quantity with its price.
     *
     * @param upTo where it ends; empty for the last
     */
    record Block(Optional<Quantity> upTo, Price price) {}

    static Blocks read(Written in) {
        List<Block> blocks = new ArrayList<>();
        for (Written each : in.list("blocks")) {
            Optional<Quantity> upTo = each.has("upTo") ? Optional.of(edge(each)) : Optional.empty();
            blocks.add(new Block(upTo, Price.read(each, "price")));
            each.refuseOtherKeys();
        }
        return new Blocks(List.copyOf(blocks));
    }

    /** A bare number is an edge in the line's own unit. */
    private static Quantity edge(Written in) {
        return in.at("upTo").isNumber() ? new Constant(in.number("upTo"), Unit.NUMBER) : in.quantity("upTo");
    }

    @Override
    public void check(Scope scope, Optional<Unit> unit) {
        BigDecimal previous = BigDecimal.ZERO;
        for (int i = 0; i < blocks.size(); i++) {
            Scope here = scope.at("blocks").at(i);
            Block block = blocks.get(i);
            boolean last = i == blocks.size() - 1;
            if (block.upTo().isEmpty() != last) {
                here.error(
                        "blocks",
                        last
                                ? "is the last block, so it must be open: take \"upTo\" away or add a block"
                                : "needs \"upTo\"; only the last block is open");
            }
            if (block.upTo().orElse(null) instanceof Constant constant) {
                if (constant.number().compareTo(previous) <= 0) {
                    here.at("upTo")
                            .error(
                                    "block-order",
                                    "must be above the block before it",
                                    Decimals.plain(constant.number()),
                                    "more than " + Decimals.plain(previous));
                }
                previous = previous.max(constant.number());
            }
            block.upTo().filter(edge -> !isBareNumber(edge)).ifPresent(edge -> checkEdge(edge, here.at("upTo"), unit));
            block.price().check(here.at("price"), unit);
            if (i > 0 && samePrice(blocks.get(i - 1).price(), block.price())) {
                here.at("price")
                        .warn("same-price", "is the price of the block before; the edge between them changes nothing");
            }
        }
    }

    private static boolean samePrice(Price before, Price price) {
        return before instanceof FixedPrice a
                && price instanceof FixedPrice b
                && a.each().compareTo(b.each()) == 0;
    }

    private static boolean isBareNumber(Quantity edge) {
        return edge instanceof Constant constant && constant.of() == Unit.NUMBER;
    }

    private static void checkEdge(Quantity edge, Scope scope, Optional<Unit> line) {
        Optional<Unit> unit = edge.unit(scope);
        if (unit.isPresent() && line.isPresent() && !unit.get().comparesWith(line.get())) {
            scope.error(
                    "unit",
                    "is in " + Scope.unitWords(unit.get()) + "; this line bills " + Scope.unitWords(line.get())
                            + ", so the edge must be " + Scope.unitWords(line.get()));
        }
    }

    @Override
    public Figure charge(Figure quantity, Facts facts) {
        BigDecimal rest = quantity.value();
        BigDecimal lower = BigDecimal.ZERO;
        BigDecimal money = BigDecimal.ZERO;
        List<Figure> charges = new ArrayList<>();
        for (Block block : blocks) {
            if (rest.signum() <= 0) {
                break;
            }
            BigDecimal slice = rest;
            Figure edge = null;
            if (block.upTo().isPresent()) {
                edge = block.upTo().get().value(facts);
                noticeFall(lower, edge, quantity, facts);
                slice = rest.min(edge.value().subtract(lower).max(BigDecimal.ZERO));
                lower = lower.max(edge.value());
            }
            if (slice.signum() > 0) {
                Figure part = edge == null
                        ? Figure.of(slice, quantity.unit(), "the rest of {}", quantity)
                        : Figure.of(slice, quantity.unit(), "up to {}", edge);
                Figure charge = block.price().charge(part, facts);
                money = money.add(charge.value());
                charges.add(charge);
                rest = rest.subtract(slice);
            }
        }
        if (charges.isEmpty()) {
            return Figure.of(money, Unit.MONEY, "{}", quantity);
        }
        return new Figure(money, Unit.MONEY, "{}" + " + {}".repeat(charges.size() - 1), charges);
    }

    private static void noticeFall(BigDecimal lower, Figure edge, Figure quantity, Facts facts) {
        if (edge.value().compareTo(lower) < 0) {
            String unit = quantity.unit().symbol();
            facts.assume(new Assumption(
                    "block-edge-falls",
                    facts.period().toString(),
                    "a block of " + unit + " ends at " + Decimals.shown(edge.value()) + " " + unit
                            + ", before it begins at " + Decimals.shown(lower) + " " + unit + "; it is taken as empty",
                    "check the edges of the rate's blocks"));
        }
    }

    @Override
    public String words(String unit) {
        if (blocks.size() == 2 && blocks.get(0).price().isFree()) {
            return "above " + edgeWords(blocks.get(0), unit) + ", at "
                    + blocks.get(1).price().words(unit);
        }
        List<String> phrases = new ArrayList<>();
        for (Block block : blocks) {
            String price =
                    block.price().isFree() ? "free" : "at " + block.price().words(unit);
            String where = block.upTo().isEmpty()
                    ? "the rest "
                    : (phrases.isEmpty() ? "up to " : "then up to ") + edgeWords(block, unit) + " ";
            phrases.add(where + price);
        }
        return String.join(", ", phrases);
    }

    private static String edgeWords(Block block, String unit) {
        Quantity edge = block.upTo().orElseThrow();
        return isBareNumber(edge) ? edge.words() + " " + unit : edge.words();
    }

    @Override
    public Optional<Quantity> freeUpTo() {
        return blocks.get(0).price().isFree() ? blocks.get(0).upTo() : Optional.empty();
    }

    @Override
    public boolean isFree() {
        return blocks.stream().allMatch(block -> block.price().isFree());
    }

    @Override
    public List<Clause> parts() {
        List<Clause> parts = new ArrayList<>();
        blocks.forEach(block -> {
            block.upTo().ifPresent(parts::add);
            parts.add(block.price());
        });
        return parts;
    }
}
