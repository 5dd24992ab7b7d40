package weighhouse.generator;

import java.util.List;
import java.util.Map;
import weighhouse.generator.book.Book;
import weighhouse.generator.book.CellAt;

/**
 * A workbook with faults and its twin without.
 *
 * @param twin null for a look-alike
 * @param faults what is seeded, without values
 * @param roots root cells of each fault, in the order of {@code faults}
 * @param outcomes cells of outcomes by name
 */
public record GeneratedCase(
    String name,
    String kind,
    String layout,
    long seed,
    Book workbook,
    Book twin,
    List<SeededFault> faults,
    List<List<CellAt>> roots,
    Map<String, CellAt> outcomes) {

  /** One third of the cases, by a hash of the seed, is kept apart for measuring. */
  public boolean keptApart() {
    long mixed = (seed ^ (seed >>> 33)) * 0xff51afd7ed558ccdL;
    return Math.floorMod(mixed ^ (mixed >>> 33), 3) == 0;
  }

  /** Whether LibreOffice can run it. */
  public boolean runsInLibreOffice() {
    return faults.stream().noneMatch(fault -> fault.formula().contains("_xlfn.LET"));
  }
}
