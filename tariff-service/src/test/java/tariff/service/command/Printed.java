// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.util.stream.Stream;
import picocli.CommandLine;

/** What a command line printed, and how it ended. */
record Printed(int exit, String out, String err) {
    private static final int COLUMNS = 100;

    static Printed by(Object... arguments) {
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        CommandLine line = Tariff.commandLine();
        line.setOut(new PrintWriter(out)).setErr(new PrintWriter(err));
        int exit = line.execute(Stream.of(arguments).map(String::valueOf).toArray(String[]::new));
        return new Printed(exit, out.toString(), err.toString().replace("\r", ""));
    }

    /** The words of what was answered, without its line breaks. */
    String words() {
        return out.replaceAll("\\s+", " ");
    }

    Printed fits() {
        assertThat(out.lines())
                .allSatisfy(line ->
                        assertThat(line.codePointCount(0, line.length())).isLessThanOrEqualTo(COLUMNS));
        return this;
    }
}
