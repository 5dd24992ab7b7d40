package weighhouse.workbook;

import com.fasterxml.aalto.stax.InputFactoryImpl;
import java.io.ByteArrayInputStream;
import java.util.concurrent.TimeUnit;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import weighhouse.workbook.file.WorkbookReader;

/**
 * Reading into the snapshot against a bare pass of the same parser over the sheets. Run with {@code
 * mvn test-compile exec:java -Dexec.classpathScope=test -Dexec.mainClass=org.openjdk.jmh.Main
 * -Dexec.args=ReadingBenchmark}.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(1)
public class ReadingBenchmark {
  private static final int COLUMNS = 50;
  private static final int SHEETS = 5;

  /** Formulas in the workbook. */
  @Param({"50000", "250000", "1000000"})
  public int formulas;

  /** How formulas that are filled down are written: one by one, or once for all. */
  @Param({"plain", "shared"})
  public String writing;

  private byte[] file;

  /** Makes the workbook. */
  @Setup
  public void make() {
    file = cohort(formulas, writing.equals("shared"));
  }

  /** All that the snapshot needs. */
  @Benchmark
  public Workbook snapshot() throws UnreadableWorkbookException {
    return WorkbookReader.read(file, "cohort.xlsx");
  }

  /** Inflating and tokenising the sheets, one after the other. */
  @Benchmark
  public long bareParser() throws Exception {
    InputFactoryImpl factory = new InputFactoryImpl();
    long events = 0;
    try (ZipInputStream zip = new ZipInputStream(new ByteArrayInputStream(file))) {
      for (ZipEntry entry = zip.getNextEntry(); entry != null; entry = zip.getNextEntry()) {
        if (entry.getName().startsWith("xl/worksheets/sheet")) {
          events += pass(factory.createXMLStreamReader(zip));
        }
      }
    }
    return events;
  }

  private static long pass(XMLStreamReader xml) throws XMLStreamException {
    long letters = 0;
    while (xml.hasNext()) {
      letters += xml.next() == XMLStreamReader.CHARACTERS ? xml.getTextLength() : 1;
    }
    return letters;
  }

  /** A cohort model of that many formulas over several sheets, with stored values. */
  static byte[] cohort(int formulas, boolean shared) {
    RawBook book = RawBook.ofSheet(sheet(formulas / SHEETS, shared));
    StringBuilder tabs = new StringBuilder("<sheet name='S' sheetId='1' r:id='r1'/>");
    for (int s = 2; s <= SHEETS; s++) {
      book.relation("r" + s, "worksheet", "worksheets/sheet" + s + ".xml");
      book.part("xl/worksheets/sheet" + s + ".xml", whole(sheet(formulas / SHEETS, shared)));
      tabs.append("<sheet name='S%d' sheetId='%d' r:id='r%d'/>".formatted(s, s, s));
    }
    String names = "<definedNames><definedName name='rate'>S!$A$1</definedName></definedNames>";
    return book.main("<sheets>" + tabs + "</sheets>" + names).bytes();
  }

  private static String whole(String content) {
    return "<worksheet xmlns='http://schemas.openxmlformats.org/spreadsheetml/2006/main'>"
        + content
        + "</worksheet>";
  }

  private static String sheet(int formulas, boolean shared) {
    int rows = formulas / COLUMNS;
    StringBuilder xml = new StringBuilder("<sheetData>");
    for (int r = 0; r < rows; r++) {
      xml.append("<row r=\"").append(r + 1).append("\">");
      for (int c = 0; c < COLUMNS; c++) {
        xml.append("<c r=\"").append(A1.cell(r, c)).append("\" s=\"3\">");
        xml.append(formula(r, c, rows, shared));
        xml.append("<v>").append(Math.pow(0.97 + c * 1e-4, r % 480) / 3).append("</v></c>");
      }
      xml.append("</row>");
    }
    return xml.append("</sheetData>").toString();
  }

  private static String formula(int r, int c, int rows, boolean shared) {
    if (shared && r > 0) {
      return "<f t=\"shared\" si=\"" + c + "\"/>";
    }
    String text = A1.cell(r, c) + "*(1-$B$" + (c + 1) + ")*(1-EXP(-rate*$A" + (r + 1) + "))";
    return shared
        ? "<f t=\"shared\" ref=\"%s:%s\" si=\"%d\">"
                .formatted(A1.cell(0, c), A1.cell(rows - 1, c), c)
            + text
            + "</f>"
        : "<f>" + text + "</f>";
  }
}
