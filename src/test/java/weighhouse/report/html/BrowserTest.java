package weighhouse.report.html;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.jsoup.Jsoup;
import org.jsoup.nodes.Document;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import weighhouse.audit.AuditResult;
import weighhouse.report.Samples;
import weighhouse.report.SchemaCheck;
import weighhouse.report.format.Format;
import weighhouse.support.Programs;

/** The page as a browser shows it; skipped where there is no Chromium. */
@Tag("browser")
class BrowserTest {
  /** Put there by {@code npm install --prefix target/axe axe-core}. */
  private static final Path AXE = Path.of("target/axe/node_modules/axe-core/axe.min.js");

  @TempDir private Path folder;
  private Path chromium;

  @BeforeEach
  void find() {
    chromium = Programs.require("chromium");
  }

  private static AuditResult sample(String name) {
    return switch (name) {
      case "held" -> Samples.held();
      case "passed" -> Samples.passed();
      case "many" -> Samples.many(300);
      case "some" -> Samples.many(9);
      default -> Samples.hostile();
    };
  }

  private Path page(AuditResult result) throws IOException {
    return Files.writeString(folder.resolve("page.html"), SchemaCheck.text(Format.HTML, result));
  }

  /** Runs Chromium on the page; gives what it prints. Its log lands beside the page. */
  private String browse(Path page, String... options) throws Exception {
    List<String> command =
        new ArrayList<>(
            List.of(
                chromium.toString(),
                "--headless",
                "--no-sandbox",
                "--disable-gpu",
                "--enable-logging=stderr",
                "--user-data-dir=" + Files.createTempDirectory(folder, "profile")));
    command.addAll(List.of(options));
    command.add(page.toUri().toString());
    Path out = folder.resolve("out.txt");
    Process process =
        new ProcessBuilder(command)
            .redirectOutput(out.toFile())
            .redirectError(folder.resolve("log.txt").toFile())
            .start();
    if (!process.waitFor(180, TimeUnit.SECONDS)) {
      process.destroyForcibly();
      throw new IOException("Chromium did not end");
    }
    return Files.readString(out);
  }

  private String complaints() throws IOException {
    return Files.readAllLines(folder.resolve("log.txt"), StandardCharsets.ISO_8859_1).stream()
        .filter(line -> line.contains("CONSOLE"))
        .reduce("", (all, line) -> all + line + "\n");
  }

  @ParameterizedTest
  @ValueSource(strings = {"held", "passed", "many", "hostile"})
  void scriptRunsWithoutAComplaint(String name) throws Exception {
    AuditResult result = sample(name);
    Document shown = Jsoup.parse(browse(page(result), "--dump-dom"));
    assertEquals("", complaints());
    int findings = result.findings().size();
    if (findings > 0) {
      assertEquals(findings + " of " + findings + " shown", shown.selectFirst("#shown").text());
      assertFalse(shown.selectFirst("#filter").hasAttr("hidden"));
    }
    assertTrue(shown.select("button.copy[hidden]").isEmpty());
  }

  @Test
  void narrowPageDoesNotScrollSideways() throws Exception {
    String html = SchemaCheck.text(Format.HTML, Samples.held());
    Path frame = folder.resolve("frame.html");
    page(Samples.held());
    Files.writeString(
        frame,
        "<!doctype html><iframe id=f width=390 height=800 srcdoc=\""
            + unlocked(html).replace("&", "&amp;").replace("\"", "&quot;")
            + "\"></iframe><p id=w></p><script>f.onload=()=>{const d=f.contentDocument"
            + ".documentElement;w.textContent=d.scrollWidth-d.clientWidth}</script>");
    Document shown = Jsoup.parse(browse(frame, "--dump-dom", "--virtual-time-budget=4000"));
    assertEquals("0", shown.selectFirst("#w").text());
  }

  @Test
  void noPrintedPageIsEmpty() throws Exception {
    Path pdftotext = Programs.require("pdftotext");
    Path pdf = folder.resolve("page.pdf");
    browse(page(Samples.held()), "--print-to-pdf=" + pdf, "--no-pdf-header-footer");
    Process process = new ProcessBuilder(pdftotext.toString(), pdf.toString(), "-").start();
    String text = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
    String[] pages = text.split("\f", -1);
    assertTrue(pages.length > 2, "several pages");
    for (int i = 0; i < pages.length - 1; i++) {
      assertFalse(pages[i].isBlank(), "page " + (i + 1));
    }
    assertTrue(text.contains("Findings") && !text.contains("Copy"), "buttons are not printed");
  }

  @ParameterizedTest
  @ValueSource(strings = {"held", "passed", "some"})
  void axeFindsNoViolation(String name) throws Exception {
    assumeTrue(Files.exists(AXE), AXE + " is not there: check skipped");
    String html = unlocked(SchemaCheck.text(Format.HTML, sample(name)));
    String run =
        "<script>"
            + Files.readString(AXE)
            + "</script><script>axe.run({runOnly:['wcag2a','wcag2aa','wcag21a','wcag21aa','wcag22aa',"
            + "'best-practice']}).then(r=>{const p=document.createElement('pre');p.id='axe';"
            + "p.textContent=r.violations.map(v=>v.id+': '+v.nodes.slice(0,3).map(n=>n.html)"
            + ".join(' | ')).join('\\n')||'none';document.body.append(p)})</script></body>";
    Path page = folder.resolve("axe.html");
    Files.writeString(page, html.replace("</body>", run));
    Document shown = Jsoup.parse(browse(page, "--dump-dom", "--virtual-time-budget=60000"));
    assertEquals("none", shown.selectFirst("#axe").wholeText());
  }

  /** Without the policy that keeps foreign scripts out, as these checks bring one. */
  private static String unlocked(String html) {
    return html.replaceFirst("<meta http-equiv=\"Content-Security-Policy\"[^>]*>", "");
  }
}
