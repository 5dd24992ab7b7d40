package weighhouse.published;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import weighhouse.formula.ShapeIndex;
import weighhouse.generator.book.Book;
import weighhouse.generator.book.BookWriter;
import weighhouse.generator.book.CellAt;
import weighhouse.recalculate.Values;
import weighhouse.recalculate.engine.Recalculations;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.Workbook;
import weighhouse.workbook.file.WorkbookReader;

/**
 * The engine against the printed results of Briggs, Claxton and Sculpher 2006 (Oxford University
 * Press): HIV model, example 2.5; total hip replacement, example 3.5.
 */
class PublishedModelsTest {

  static List<Arguments> printed() {
    Book hiv = HivModel.book();
    Book hip = HipModel.book();
    return List.of(
        Arguments.of("HIV life years, monotherapy", hiv, HivModel.LIFE_YEARS_MONO, 7.9912066, 1e-7),
        Arguments.of("HIV cost, monotherapy", hiv, HivModel.COST_MONO, 44663.4535637, 1e-6),
        Arguments.of(
            "HIV life years, combined", hiv, HivModel.LIFE_YEARS_COMBINED, 8.9373889, 1e-7),
        Arguments.of("HIV cost, combined", hiv, HivModel.COST_COMBINED, 50601.6513312, 1e-6),
        Arguments.of("HIV ICER", hiv, HivModel.ICER, 6275.9556, 1e-4),
        Arguments.of("hip cost, standard", hip, HipModel.COST_STANDARD, 512.434658, 1e-6),
        Arguments.of("hip QALYs, standard", hip, HipModel.QALY_STANDARD, 14.6531896, 1e-7),
        Arguments.of("hip cost, new", hip, HipModel.COST_NEW, 610.311818, 1e-6),
        Arguments.of("hip QALYs, new", hip, HipModel.QALY_NEW, 14.69770986, 1e-8),
        Arguments.of("hip ICER", hip, HipModel.ICER, 2198.486665, 1e-6));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("printed")
  void reproducesThePrintedResult(
      String name, Book book, String cell, double printed, double tolerance, @TempDir Path folder)
      throws Exception {
    Path file = folder.resolve("published.xlsx");
    BookWriter.write(book, file);
    Workbook workbook = WorkbookReader.read(file);
    Values values = Recalculations.compile(workbook, ShapeIndex.of(workbook)).base();
    CellAt at = CellAt.of(cell);
    CellAddress address = new CellAddress(workbook.sheetIndex(at.sheet()), at.row(), at.column());
    assertEquals(printed, values.number(address), tolerance, name);
  }
}
