// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.math.BigDecimal;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import picocli.CommandLine.Option;
import tariff.correction.Estimate;
import tariff.notice.Finding;
import tariff.notice.Refusal;
import tariff.service.request.ChoiceTerms;
import tariff.service.request.ChoiceTerms.Shape;
import tariff.service.request.Declared;
import tariff.service.request.OutlookTerms;
import tariff.service.request.PriceTerms;
import tariff.service.request.SizeTerms;

/** Among which banks to choose, and what they cost. */
@SuppressWarnings("NullAway.Init") // picocli fills them in
final class SizeOptions {
    @Option(
            names = "--prices",
            paramLabel = "FILE",
            description =
                    "a list of prices, a JSON file; the other options of price, upkeep and life are then not used")
    private Optional<Path> file;

    @Option(names = "--per-kvar", paramLabel = "MONEY", description = "price of each kvar")
    private Optional<BigDecimal> perKvar;

    @Option(names = "--per-step", paramLabel = "MONEY", description = "price of each switched step", defaultValue = "0")
    private BigDecimal perStep;

    @Option(names = "--fixed-part", paramLabel = "MONEY", description = "paid once for any bank", defaultValue = "0")
    private BigDecimal fixedPart;

    @Option(
            names = "--upkeep",
            paramLabel = "SHARE",
            description = "upkeep a year as a part of the cost: 0.02",
            defaultValue = "0")
    private BigDecimal upkeep;

    @Option(names = "--life", paramLabel = "YEARS", description = "${DEFAULT-VALUE} unless said", defaultValue = "15")
    private int lifeYears;

    @Option(names = "--discount", paramLabel = "SHARE", description = "discount rate a year: 0.08", required = true)
    private BigDecimal discountRate;

    @Option(
            names = "--shape",
            split = ",",
            paramLabel = "SHAPE",
            description = "fixed, automatic or mixed, one or more; fixed,automatic unless said")
    private Set<Shape> shapes = Set.of(Shape.FIXED, Shape.AUTOMATIC);

    @Option(
            names = "--step-count",
            paramLabel = "STEPS",
            description = "equal switched steps of a bank of any size; ${DEFAULT-VALUE} unless said",
            defaultValue = "5")
    private int steps;

    @Option(
            names = "--fixed-share",
            paramLabel = "SHARE",
            description = "part of a mixed bank that is always on; ${DEFAULT-VALUE} unless said",
            defaultValue = "0.3")
    private BigDecimal fixedShare;

    @Option(
            names = "--increment",
            paramLabel = "KVAR",
            description = "sizes differ by so much; a round one unless said")
    private Optional<BigDecimal> increment;

    @Option(
            names = "--most",
            paramLabel = "KVAR",
            description = "the largest bank that has room; what the meters read at most unless said")
    private Optional<BigDecimal> most;

    @Option(
            names = "--available",
            split = ",",
            paramLabel = "KVAR",
            description = "units that can be bought, in place of any size: 25,50")
    private List<BigDecimal> available = List.of();

    @Option(
            names = "--units",
            paramLabel = "UNITS",
            description = "units that a bank has room for; ${DEFAULT-VALUE} unless said",
            defaultValue = "6")
    private int units;

    @Option(
            names = "--basis",
            paramLabel = "ESTIMATE",
            description = "low, central or high: what answers rest on; ${DEFAULT-VALUE} unless said",
            defaultValue = "central")
    private Estimate basis;

    SizeTerms terms() {
        ChoiceTerms choice = Declared.require(new ChoiceTerms(
                shapes,
                steps,
                fixedShare,
                increment,
                most,
                available,
                units,
                ChoiceTerms.usual().make()));
        OutlookTerms outlook = Declared.require(OutlookTerms.level(Optional.of(discountRate)));
        return new SizeTerms(choice, file.map(Files::prices).orElseGet(this::prices), outlook, basis);
    }

    private PriceTerms prices() {
        BigDecimal price = perKvar.orElseThrow(() -> new Refusal(Finding.error(
                "no-prices", "", "give either --prices or --per-kvar: there are no prices but your own")));
        return Declared.require(new PriceTerms(fixedPart, price, price, perStep, upkeep, lifeYears));
    }
}
