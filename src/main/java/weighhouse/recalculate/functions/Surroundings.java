package weighhouse.recalculate.functions;

import weighhouse.workbook.CellAddress;
import weighhouse.workbook.Workbook;

/** What a function may ask of the place where it is called. */
public interface Surroundings {
  /** The cell whose formula calls. */
  CellAddress host();

  Workbook workbook();

  /** The cells of a reference with their present values. */
  Grid cells(Reference reference);

  /** What a text such as {@code Sheet1!A1:B2} or a defined name points at, or null. */
  Reference referenceOf(String text);

  /** A draw from the uniform distribution on (0, 1), the next of this cell in this run. */
  double random();
}
