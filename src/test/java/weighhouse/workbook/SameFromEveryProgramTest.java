package weighhouse.workbook;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.File;
import java.math.BigDecimal;
import java.math.MathContext;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import weighhouse.support.Programs;
import weighhouse.workbook.file.WorkbookReader;

/** The same content, written by POI or saved again by LibreOffice, gives the same snapshot. */
class SameFromEveryProgramTest {
  @TempDir static Path folder;
  private static Path office;

  @BeforeAll
  static void makeFiles() throws Exception {
    for (String name : SampleBooks.fileNames().toList()) {
      Files.write(folder.resolve(name), SampleBooks.sample(name));
    }
  }

  @AfterAll
  static void forget() {
    office = null;
  }

  /** The file as LibreOffice saves it in that format. */
  private static Workbook saved(String source, String format) throws Exception {
    office = Programs.require("soffice");
    Path out = folder.resolve(source + "-as-" + format);
    Process process =
        new ProcessBuilder(
                office.toString(),
                "-env:UserInstallation=" + folder.resolve("profile").toUri(),
                "--headless",
                "--convert-to",
                format,
                "--outdir",
                out.toString(),
                folder.resolve(source).toString())
            .redirectErrorStream(true)
            .redirectOutput(new File(folder.toFile(), "office.log"))
            .start();
    if (!process.waitFor(120, TimeUnit.SECONDS)) {
      process.destroyForcibly();
    }
    return WorkbookReader.read(out.resolve("sample." + format.replaceAll(":.*", "")));
  }

  /** All that an audit looks at, as lines that can be compared. */
  private static List<String> lines(Workbook book) {
    List<String> lines = new ArrayList<>();
    lines.add(book.names() + " " + book.date1904() + " " + book.macros() + " " + book.problems());
    for (Sheet sheet : book.sheets()) {
      lines.add(sheet.name() + " " + sheet.visibility() + " " + sheet.arrays());
      lines.add(sheet.merged() + " " + sheet.comments());
      lines.add(sheet.hiddenRows() + " " + sheet.hiddenColumns() + " " + sheet.tables());
      CellStore cells = sheet.cells();
      for (int i = 0; i < cells.size(); i++) {
        lines.add(cell(cells, i));
      }
    }
    return lines;
  }

  private static String cell(CellStore cells, int i) {
    String formula = cells.formula(i);
    String anchor = A1.cell(cells.anchorRow(i), cells.anchorColumn(i));
    return A1.cell(cells.row(i), cells.column(i))
        + " "
        + cells.kind(i)
        + " "
        + cells.number(i)
        + " "
        + cells.text(i)
        + " "
        + cells.numberFormat(i)
        + " "
        + cells.role(i)
        + (formula == null ? "" : " =" + formula + " at " + anchor);
  }

  /**
   * What LibreOffice itself changes: numbers are stored with 15 digits, constant truth values and
   * errors become formulas, an empty text is dropped, very hidden sheets are merely hidden.
   */
  private static List<String> withoutItsHabits(List<String> lines) {
    return lines.stream()
        .filter(line -> !line.matches("\\w+ TEXT NaN  General NONE"))
        .map(line -> line.replace("VERY_HIDDEN", "HIDDEN"))
        .map(line -> line.replaceAll("PLAIN =((TRUE|FALSE)(\\(\\))?|#N/A) at .*", "NONE"))
        .map(SameFromEveryProgramTest::rounded)
        .toList();
  }

  private static String rounded(String line) {
    String[] words = line.split(" ", 4);
    if (words.length == 4 && words[1].equals("NUMBER")) {
      BigDecimal number = new BigDecimal(words[2]).round(new MathContext(12));
      return words[0] + " " + number.stripTrailingZeros() + " " + words[3];
    }
    return line;
  }

  private static void sameButForItsHabits(Workbook expected, Workbook actual) {
    same(withoutItsHabits(lines(expected)), withoutItsHabits(lines(actual)));
  }

  private static void same(List<String> expected, List<String> actual) {
    List<String> missing = new ArrayList<>(expected);
    missing.removeAll(actual);
    List<String> added = new ArrayList<>(actual);
    added.removeAll(expected);
    assertEquals(String.join("\n", missing), String.join("\n", added));
  }

  private static Workbook original(String name) throws Exception {
    return WorkbookReader.read(folder.resolve(name));
  }

  @Test
  void bothFormatsOfPoi() throws Exception {
    same(lines(original("sample.xlsx")), lines(original("sample.xls")));
  }

  @Test
  void xlsxOfLibreOffice() throws Exception {
    sameButForItsHabits(
        original("sample.xlsx"), saved("sample.xlsx", "xlsx:Calc MS Excel 2007 XML"));
  }

  @Test
  void xlsOfLibreOffice() throws Exception {
    sameButForItsHabits(original("sample.xlsx"), saved("sample.xlsx", "xls:MS Excel 97"));
  }
}
