package weighhouse.quantity;

import java.util.List;
import java.util.Optional;
import weighhouse.formula.Expr;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** What every number of a workbook means, as far as labels and algebra tell. */
public interface Quantities {
  /** The quantity of a cell; {@link Quantity#UNKNOWN} where nothing tells. */
  Quantity at(CellAddress cell);

  /** The quantity with its evidence. */
  Inferred inferred(CellAddress cell);

  /** The quantity of an expression that stands in the host cell. */
  Quantity of(Expr expression, CellAddress host);

  /** A short label for people, from the cells around it or its name; never null, may be empty. */
  String label(CellAddress cell);

  /** All cells with a known quantity, as ranges of one quantity. */
  List<CellRange> ranges();

  /** The model's cycle. */
  Cycle cycle();

  /** The model's results, most telling first. */
  List<Outcome> outcomes();

  /** The cell with the willingness-to-pay threshold, if the workbook tells one. */
  Optional<CellAddress> threshold();

  /** Whether independent signals say that this workbook is a health-economic model at all. */
  boolean healthEconomic();
}
