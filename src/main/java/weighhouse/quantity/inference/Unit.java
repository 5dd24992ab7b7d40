package weighhouse.quantity.inference;

import java.util.ArrayList;
import java.util.List;
import weighhouse.formula.Expr;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.algebra.Demand;
import weighhouse.quantity.label.Guess;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/**
 * Cells that mean the same: a number with its own label, or a line of cells of one formula (or of
 * typed-in numbers) under one label. What is known of it grows while the inference runs.
 */
final class Unit {
  final int id;
  final CellRange range;

  /** The formula, relative to each of the cells; null of typed-in numbers. */
  final Expr tree;

  Guess guess = Guess.NONE;
  Quantity declared;

  /** What the formula gives. */
  Quantity up = Quantity.UNKNOWN;

  /** Told by the place in a trace or a matrix, with the sentence that says so. */
  Kind structural = Kind.UNKNOWN;

  String structure = "";

  /** Whether the formula carries a cohort on from the cycle before. */
  boolean trace;

  /** What other formulas need it to be; the first is believed. */
  final List<Demand> demands = new ArrayList<>(0);

  Verdict verdict = Verdict.NOTHING;

  Unit(int id, CellRange range, Expr tree) {
    this.id = id;
    this.range = range;
    this.tree = tree;
  }

  CellAddress host() {
    return range.first();
  }

  boolean isCalculated() {
    return tree != null;
  }

  Quantity quantity() {
    return verdict.quantity();
  }

  Kind kind() {
    return verdict.quantity().kind();
  }

  /** Takes a demand in; a firm one comes before others. Says whether it is new. */
  boolean add(Demand demand) {
    for (Demand known : demands) {
      if (known.kind() == demand.kind() && (known.firm() || !demand.firm())) {
        return false;
      }
    }
    boolean first = demand.firm() && demands.stream().noneMatch(Demand::firm);
    demands.add(first ? 0 : demands.size(), demand);
    return true;
  }
}
