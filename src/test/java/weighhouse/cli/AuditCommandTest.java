package weighhouse.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import weighhouse.audit.AuditResult;
import weighhouse.report.Samples;
import weighhouse.workbook.UnreadableWorkbookException;

class AuditCommandTest {
  @TempDir private Path folder;
  private final Terminal terminal = new Terminal(AuditCommandTest::audit);
  private Path out;

  private static AuditResult audit(Path file) throws UnreadableWorkbookException {
    String name = file.getFileName().toString();
    return switch (name.substring(0, name.indexOf('.'))) {
      case "held" -> Samples.held();
      case "hostile" -> Samples.hostile();
      case "crash" -> throw new IllegalStateException("unforeseen");
      case "bad" -> throw new UnreadableWorkbookException(name + " is no workbook.");
      default -> Samples.passed();
    };
  }

  @BeforeEach
  void names() {
    out = folder.resolve("reports");
  }

  private String file(String name) throws IOException {
    Path file = folder.resolve("models").resolve(name);
    Files.createDirectories(file.getParent());
    return Files.writeString(file, "workbook").toString();
  }

  private Set<String> written() throws IOException {
    try (Stream<Path> files = Files.list(out)) {
      return files.map(file -> file.getFileName().toString()).collect(Collectors.toSet());
    }
  }

  @Test
  void writesPageAndJsonUnlessToldOtherwise() throws Exception {
    assertEquals(0, terminal.run("audit", file("held.xlsx"), "--out", out.toString()));
    assertEquals(Set.of("held.xlsx.audit.html", "held.xlsx.audit.json"), written());
    String said = terminal.out.toString();
    assertTrue(said.startsWith("HOLD  cohort model.xlsm: 2 findings, 1 more accepted"), said);
    assertTrue(said.contains("18,734 now, 21,481 corrected"), said);
    assertTrue(said.contains(out.resolve("held.xlsx.audit.html").toString()), said);
    assertEquals("", terminal.err.toString());
  }

  @Test
  void writesTheFormatsAskedFor() throws Exception {
    String[] formats = {"--format", "sarif,junit,csv", "--quiet"};
    assertEquals(
        0,
        terminal.run(
            "audit",
            file("right.xlsx"),
            "--out",
            out.toString(),
            formats[0],
            formats[1],
            formats[2]));
    assertEquals(
        Set.of("right.xlsx.audit.sarif", "right.xlsx.audit.junit.xml", "right.xlsx.audit.csv"),
        written());
    assertEquals("", terminal.out.toString());
  }

  @Test
  void oneBadFileDoesNotStopTheRest() throws Exception {
    file("held.xlsx");
    file("bad.xlsx");
    file("crash.xls");
    file("~$held.xlsx");
    file("notes.txt");
    assertEquals(
        2, terminal.run("audit", folder.resolve("models").toString(), "--out", out.toString()));
    assertEquals(
        Set.of("held.xlsx.audit.html", "held.xlsx.audit.json", "index.html", "index.json"),
        written());
    assertTrue(terminal.err.toString().contains("bad.xlsx is no workbook."));
    assertTrue(terminal.err.toString().contains("crash.xls could not be audited"));
    assertFalse(terminal.err.toString().contains("\tat "), "no stack trace");
  }

  @Test
  void twoFilesOfOneNameGetTwoReports() throws Exception {
    String one = file("a/right.xlsx");
    String other = file("b/right.xlsx");
    assertEquals(0, terminal.run("audit", one, other, "--out", out.toString(), "--format", "json"));
    assertEquals(
        Set.of("right.xlsx.audit.json", "2-right.xlsx.audit.json", "index.json"), written());
  }

  @Test
  void terminalNeverObeysTheWorkbook() throws Exception {
    assertEquals(0, terminal.run("audit", file("hostile.xlsx"), "--out", out.toString()));
    assertEquals(-1, terminal.out.toString().indexOf('\u001B'));
    assertEquals(-1, terminal.out.toString().indexOf('\u202E'));
  }

  @Test
  void wrongUseIsTwo() throws Exception {
    assertEquals(2, terminal.run());
    assertEquals(2, terminal.run("audit"));
    assertEquals(2, terminal.run("audit", "--nonsense"));
    assertEquals(2, terminal.run("weigh"));
    assertEquals(2, terminal.run("audit", file("held.xlsx"), "--format", "pdf"));
    assertEquals(2, terminal.run("audit", file("held.xlsx"), "--rules", "no-such-folder"));
    assertFalse(terminal.err.toString().contains("\tat "), "no stack trace");
  }

  @Test
  void helpIsNoFault() {
    assertEquals(0, terminal.run("--help"));
    assertTrue(terminal.out.toString().contains("gate"), "all commands are listed");
    assertEquals(0, terminal.run("audit", "--help"));
  }
}
