// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.io.UncheckedIOException;
import java.util.Objects;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;
import picocli.CommandLine.TypeConversionException;
import tariff.csv.DateOrder;
import tariff.csv.DecimalMark;
import tariff.intervalfile.GapRule;
import tariff.intervalfile.Role;
import tariff.meter.Unit;
import tariff.notice.Finding;
import tariff.notice.Refusal;

/** The command that holds the others. */
@Command(
        name = "tariff-service",
        description = "What low power factor costs under your own rate, and what a capacitor bank would save.",
        subcommands = {
            CheckCommand.class,
            StatementCommand.class,
            ReconcileCommand.class,
            ClausesCommand.class,
            AssessCommand.class,
            SizeCommand.class,
            ReviewCommand.class,
            ScreenCommand.class,
            ReportCommand.class,
            ServeCommand.class
        },
        mixinStandardHelpOptions = true,
        version = "tariff-service 0.1.0-SNAPSHOT",
        exitCodeListHeading = "%nExit codes:%n",
        exitCodeList = {
            "0:answered",
            "1:a file cannot be read or written, or is not what it should be at all",
            "2:there are findings, one a line on the standard error",
            "64:the command line itself is wrong"
        })
public final class Tariff implements Runnable {
    private static final Set<String> NO_DOCUMENT = Set.of("not-json", "not-text", "unreadable", "unwritable");

    @Spec
    private @Nullable CommandSpec spec;

    /** The command line, ready to execute. */
    public static CommandLine commandLine() {
        CommandLine line = new CommandLine(new Tariff());
        line.setCaseInsensitiveEnumValuesAllowed(true);
        line.registerConverter(Unit.class, word -> one("unit", Unit.values(), Unit::symbol, word));
        line.registerConverter(DateOrder.class, word -> one("order", DateOrder.values(), DateOrder::word, word));
        line.registerConverter(DecimalMark.class, word -> one("mark", DecimalMark.values(), DecimalMark::word, word));
        line.registerConverter(GapRule.class, word -> one("rule", GapRule.values(), GapRule::word, word));
        line.registerConverter(Role.class, word -> one("column", Role.values(), Role::word, word));
        line.setUsageHelpWidth(Wrapped.WIDTH);
        line.setExecutionExceptionHandler(Tariff::explain);
        line.getSubcommands().values().forEach(each -> each.getCommandSpec().exitCodeOnInvalidInput(Exit.USAGE));
        line.getCommandSpec().exitCodeOnInvalidInput(Exit.USAGE);
        return line;
    }

    private static <T> T one(String what, T[] values, Function<T, String> name, String word) {
        return Stream.of(values)
                .filter(each -> name.apply(each).equals(word))
                .findFirst()
                .orElseThrow(() -> new TypeConversionException("\"" + word + "\" is no " + what + "; one of: "
                        + Stream.of(values)
                                .map(name)
                                .filter(each -> !each.isEmpty())
                                .collect(Collectors.joining(", "))));
    }

    @Override
    public void run() {
        throw new ParameterException(Objects.requireNonNull(spec).commandLine(), "Say what to do.");
    }

    private static int explain(Exception failure, CommandLine line, CommandLine.ParseResult parsed) throws Exception {
        if (failure instanceof Refusal refusal) {
            refusal.findings().forEach(finding -> line.getErr().println(finding));
            line.getErr().flush();
            return refusal.findings().stream().anyMatch(Tariff::isNoDocument) ? Exit.UNUSABLE_FILE : Exit.FINDINGS;
        }
        if (failure instanceof UncheckedIOException unreadable) {
            line.getErr().println("cannot be read: " + unreadable.getMessage());
            line.getErr().flush();
            return Exit.UNUSABLE_FILE;
        }
        throw failure;
    }

    private static boolean isNoDocument(Finding finding) {
        return NO_DOCUMENT.contains(finding.code());
    }
}
