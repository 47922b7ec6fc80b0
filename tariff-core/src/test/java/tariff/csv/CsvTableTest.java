// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;

/** Quotes by RFC 4180, section 2; the apostrophe before formulas by OWASP, CSV Injection. */
class CsvTableTest {

    @Test
    void textsAreQuotedOnlyWhereNeededAndNumbersArePlain() {
        assertThat(CsvTable.of("Month", "Line", "Amount")
                        .row("2026-01", "Energy, \"day\"", new BigDecimal("1E+3"))
                        .row("2026-02", "two\nlines", -5)
                        .text())
                .isEqualTo(
                        "Month,Line,Amount\r\n2026-01,\"Energy, \"\"day\"\"\",1000\r\n2026-02,\"two\nlines\",-5\r\n");
    }

    @Test
    void aTextThatWouldRunAsAFormulaDoesNot() {
        assertThat(CsvTable.of("=name")
                        .row("=1+1", "+1")
                        .row("-1", "@sum")
                        .row("a=b", "")
                        .text())
                .isEqualTo("'=name\r\n'=1+1,'+1\r\n'-1,'@sum\r\na=b,\r\n");
    }

    @Test
    void bytesAreUtf8() {
        assertThat(CsvTable.of("März").bytes()).isEqualTo("März\r\n".getBytes(StandardCharsets.UTF_8));
    }
}
