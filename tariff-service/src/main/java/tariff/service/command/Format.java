// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.io.PrintWriter;
import tariff.json.JsonObject;

/** How an answer is printed. */
enum Format {
    TEXT,
    JSON,
    CSV;

    /** An answer that can be printed in each format. */
    interface Printable {
        String text();

        JsonObject json();

        String csv();
    }

    void print(Printable answer, PrintWriter out) {
        out.print(
                switch (this) {
                    case TEXT -> answer.text();
                    case JSON -> new String(answer.json().bytes(), java.nio.charset.StandardCharsets.UTF_8) + "\n";
                    case CSV -> answer.csv();
                });
        out.flush();
    }
}
