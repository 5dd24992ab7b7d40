package weighhouse.quantity.algebra;

import java.util.Optional;
import weighhouse.formula.Expr;
import weighhouse.quantity.Quantity;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** What a formula's references stand for, as far as is known at the moment. */
public interface Operands {
  /** The cells that a reference, a name or a lookup with a literal key means; empty if unknown. */
  Optional<CellRange> cells(Expr reference, CellAddress host);

  /** What all the cells of the range have in common; UNKNOWN where they differ. */
  Quantity quantity(CellRange range);

  /** The number in a cell; NaN where there is none. */
  double number(CellAddress cell);

  /** What a name that stands for no cell means, by its words and its formula. */
  Quantity named(Expr.NameRef name, CellAddress host);
}
