package weighhouse.formula.normal;

import java.util.Optional;
import weighhouse.workbook.CellAddress;

/** Decides which cells are mere steps of a calculation whose formula stands in for them. */
@FunctionalInterface
public interface Helpers {
  /** No cell is looked through. */
  Helpers NONE = cell -> Optional.empty();

  /** The formula to put in place of a reference to the cell, or empty to keep the reference. */
  Optional<Hosted> formula(CellAddress cell);
}
