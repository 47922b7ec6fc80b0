// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.io.PrintWriter;
import java.io.StringWriter;
import picocli.CommandLine;

/** A command that has been run, and what it printed. */
record Ran(int exit, String out, String err) {

    static Ran of(Object... arguments) {
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        CommandLine line = Tariff.commandLine();
        line.setOut(new PrintWriter(out)).setErr(new PrintWriter(err));
        int exit = line.execute(
                java.util.stream.Stream.of(arguments).map(String::valueOf).toArray(String[]::new));
        return new Ran(exit, out.toString(), err.toString().replace("\r", ""));
    }
}
