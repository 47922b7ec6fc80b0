// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.File;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * The report in a real browser, looked through by axe-core for what shuts readers out: WCAG 2.0 and 2.1, levels A and AA, and best
 * practices. Without a Chromium on the path it is skipped, or fails where {@code -Dtariff.browser=required}.
 */
class ReportInABrowserTest {
    private static final Pattern FOUND = Pattern.compile("<pre id=\"found\">(.*?)</pre>", Pattern.DOTALL);
    private static final String LOOK = """
            <script src="axe.js"></script>
            <script>
            axe.run(document).then(result => {
              const found = document.createElement('pre');
              found.id = 'found';
              found.textContent = 'passed ' + (result.passes.length > 15) + '\\n'
                + 'fits ' + (document.documentElement.scrollWidth <= document.documentElement.clientWidth) + '\\n'
                + result.violations.map(rule => rule.id + ': ' + rule.nodes.map(node => node.target).join(' ')).join('\\n');
              document.body.append(found);
            });
            </script>
            </body>""";

    private static String browser = "";

    @TempDir
    private Path directory;

    @BeforeAll
    static void findABrowser() {
        Optional<String> found = Stream.of(System.getenv("PATH").split(File.pathSeparator))
                .flatMap(place -> Stream.of("chromium", "chromium-browser").map(name -> Path.of(place, name)))
                .filter(Files::isExecutable)
                .map(Path::toString)
                .findFirst();
        if (System.getProperty("tariff.browser", "").equals("required")) {
            assertThat(found).as("a Chromium on the path").isPresent();
        }
        assumeTrue(found.isPresent(), "no Chromium on the path: the report was not looked at in a browser");
        browser = found.get();
    }

    @ParameterizedTest
    @ValueSource(ints = {1280, 500})
    void shutsNobodyOut(int width) throws Exception {
        assertThat(look(Handed.full().html(), width)).isEqualTo("passed true\nfits true\n");
        assertThat(look(Handed.bare().html(), width)).isEqualTo("passed true\nfits true\n");
    }

    @Test
    void wouldNoticeIfItDid() throws Exception {
        String poor =
                Handed.plain().html().replace("<html lang=\"en\">", "<html>").replace("color: #444", "color: #bbb");
        assertThat(look(poor, 1280)).contains("color-contrast: ").contains("html-has-lang: html");
    }

    private String look(String html, int width) throws IOException, InterruptedException {
        try (InputStream axe =
                getClass().getResourceAsStream("/META-INF/resources/webjars/axe-core/4.6.3/axe.min.js")) {
            Files.write(directory.resolve("axe.js"), axe.readAllBytes());
        }
        String open = html.replaceFirst("<meta http-equiv=\"Content-Security-Policy\"[^>]*>", "");
        Path page = Files.writeString(directory.resolve("report.html"), open.replace("</body>", LOOK));
        Path dump = directory.resolve("dump.html");
        Process process = new ProcessBuilder(List.of(
                        browser,
                        "--headless",
                        "--no-sandbox",
                        "--disable-gpu",
                        "--disable-dev-shm-usage",
                        "--disable-background-networking",
                        "--disable-component-update",
                        "--no-first-run",
                        "--user-data-dir=" + directory.resolve("profile"),
                        "--window-size=" + width + ",900",
                        "--virtual-time-budget=60000",
                        "--dump-dom",
                        page.toUri().toString()))
                .redirectOutput(dump.toFile())
                .redirectError(ProcessBuilder.Redirect.DISCARD)
                .start();
        if (!process.waitFor(5, TimeUnit.MINUTES)) {
            process.destroyForcibly();
        }
        String seen = Files.readString(dump, StandardCharsets.UTF_8);
        Matcher found = FOUND.matcher(seen);
        assertThat(found.find()).as("the browser answers").isTrue();
        return found.group(1);
    }
}
