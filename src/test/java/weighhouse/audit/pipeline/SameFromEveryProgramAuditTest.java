package weighhouse.audit.pipeline;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.InputStream;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import weighhouse.audit.AuditOptions;
import weighhouse.audit.AuditResult;
import weighhouse.support.Programs;

/**
 * The same model saved by POI and by LibreOffice, as .xlsx and as .xls, gives the same findings.
 */
class SameFromEveryProgramAuditTest {
  private static final Path DEMO = Path.of("demo-workbooks", "cohort-faulty.xlsx");
  private static final Auditor AUDITOR = new Auditor(AuditOptions.DEFAULT);

  @Test
  void savedByPoi(@TempDir Path folder) throws Exception {
    Path copy = folder.resolve("copy.xlsx");
    try (InputStream in = Files.newInputStream(DEMO);
        XSSFWorkbook workbook = new XSSFWorkbook(in);
        OutputStream out = Files.newOutputStream(copy)) {
      workbook.write(out);
    }
    assertEquals(findings(DEMO), findings(copy));
  }

  @Test
  void savedByLibreOfficeAsXlsx(@TempDir Path folder) throws Exception {
    assertEquals(findings(DEMO), findings(converted(folder, "xlsx")));
  }

  @Test
  void savedByLibreOfficeAsXls(@TempDir Path folder) throws Exception {
    assertEquals(findings(DEMO), findings(converted(folder, "xls")));
  }

  private static Path converted(Path folder, String format) throws Exception {
    Path soffice = Programs.require("soffice");
    Process process =
        new ProcessBuilder(
                soffice.toString(),
                "-env:UserInstallation=" + folder.resolve("profile").toUri(),
                "--headless",
                "--convert-to",
                format,
                "--outdir",
                folder.resolve("out").toString(),
                DEMO.toString())
            .redirectErrorStream(true)
            .redirectOutput(folder.resolve("log.txt").toFile())
            .start();
    if (!process.waitFor(3, TimeUnit.MINUTES)) {
      process.destroyForcibly();
    }
    return folder.resolve("out").resolve("cohort-faulty." + format);
  }

  /** One line a finding: rule, cells, corrected formula, and values to nine digits. */
  private static List<String> findings(Path file) throws Exception {
    AuditResult result = AUDITOR.audit(file);
    return result.findings().stream()
        .map(
            f ->
                f.rule().id()
                    + f.cells().stream().map(result.workbook()::show).sorted().toList()
                    + f.suggestedFormula()
                    + f.values().stream()
                        .map(v -> String.format("%.9g", v.correct().number()))
                        .sorted()
                        .toList())
        .sorted()
        .toList();
  }
}
