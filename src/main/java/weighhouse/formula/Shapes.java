package weighhouse.formula;

import java.util.List;
import java.util.Map;
import weighhouse.workbook.CellAddress;

/**
 * Every formula of a workbook, parsed once per distinct shape, with the regions each shape fills.
 */
public interface Shapes {
  /** The distinct shapes that could be parsed. */
  List<Shape> all();

  /** Rectangles of one shape, ordered by sheet, row, column. Array formulas: the anchor's range. */
  List<Region> regions();

  /** Shape of a stored cell by its index in the sheet's store; negative where it has none. */
  int shapeOf(int sheet, int cellIndex);

  /** Shape at an address, or null. */
  Shape at(CellAddress cell);

  /** Region at an address, or null. */
  Region regionAt(CellAddress cell);

  /** Formula cells that could not be parsed, with the reason. */
  Map<CellAddress, String> unparsed();
}
