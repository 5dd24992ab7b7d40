package weighhouse.generator;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import weighhouse.generator.book.CellAt;
import weighhouse.generator.book.StoredValues;
import weighhouse.support.Programs;

/** The generator's own sanity: its workbooks open, calculate and are described truly. */
class GeneratorTest {
  private static final int CASES = 16;

  @TempDir Path folder;

  @Test
  void sameSeedGivesTheSameCases() {
    List<GeneratedCase> once = Generator.cases(CASES, 7);
    List<GeneratedCase> again = Generator.cases(CASES, 7);
    for (int i = 0; i < CASES; i++) {
      assertEquals(once.get(i).faults(), again.get(i).faults());
      assertEquals(once.get(i).name(), again.get(i).name());
    }
  }

  @Test
  void manifestSaysWhatTheWorkbooksHold() throws Exception {
    List<GeneratedCase> cases = Generator.cases(8, 11);
    Manifest written = GeneratorMain.write(folder, 11, cases, null);
    assertEquals(written, Manifest.read(folder));
    for (CaseRecord one : written.cases()) {
      assertTrue(StoredValues.of(folder.resolve(one.file())).formulas() > 0, one.name());
    }
  }

  @Test
  void twinsDifferAtTheRootsAndNowhereElse() {
    for (GeneratedCase one : Generator.cases(CASES * 5, 13)) {
      if (one.twin() == null) {
        assertTrue(one.faults().isEmpty(), one.name());
        continue;
      }
      assertFalse(one.faults().isEmpty(), one.name());
      List<CellAt> differences = differences(one);
      assertFalse(differences.isEmpty(), one.name());
      assertTrue(one.roots().stream().flatMap(List::stream).toList().containsAll(differences));
    }
  }

  private static List<CellAt> differences(GeneratedCase one) {
    return one.workbook().sheets().stream()
        .flatMap(sheet -> sheet.cells().entrySet().stream())
        .filter(
            cell ->
                !cell.getValue()
                    .equals(one.twin().sheet(cell.getKey().sheet()).cells().get(cell.getKey())))
        .map(java.util.Map.Entry::getKey)
        .sorted()
        .toList();
  }

  @Test
  @Tag("slow")
  void twinsCalculateWithoutErrors() throws Exception {
    Path soffice = Programs.require("soffice");
    for (CaseRecord one :
        GeneratorMain.write(folder, 17, Generator.cases(CASES, 17), soffice).cases()) {
      String fine = one.twin() == null ? one.file() : one.twin();
      assertEquals(List.of(), StoredValues.of(folder.resolve(fine)).errors(), one.name());
      assertEquals(one.outcomes().size(), one.expectedOutcomes().size(), one.name());
    }
  }
}
