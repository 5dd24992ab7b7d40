package weighhouse.audit.pipeline;

import java.util.Optional;
import weighhouse.formula.Expr;
import weighhouse.formula.ReferenceResolver;
import weighhouse.formula.Trees;
import weighhouse.rules.Subject;
import weighhouse.workbook.CellAddress;

/** The reference in a formula that brings a measure in, as it is or through a copy of its cell. */
final class MeasureReference {
  private MeasureReference() {}

  /** The only reference to the measure's value; empty where there is none or more than one cell. */
  static Optional<Expr> in(Subject subject, Expr tree, CellAddress host, CellAddress measure) {
    ReferenceResolver resolver = new ReferenceResolver(subject.workbook());
    double value = subject.recalculation().base().number(measure);
    Expr found = null;
    for (Expr node : Trees.walk(tree)) {
      Optional<CellAddress> cell =
          node instanceof Expr.CellRef || node instanceof Expr.NameRef
              ? resolver.cell(node, host)
              : Optional.empty();
      if (cell.isPresent() && carries(subject, cell.get(), measure, value)) {
        if (found != null && !found.equals(node)) {
          return Optional.empty();
        }
        found = node;
      }
    }
    return Optional.ofNullable(found);
  }

  private static boolean carries(
      Subject subject, CellAddress cell, CellAddress measure, double value) {
    return cell.equals(measure)
        || (subject.recalculation().base().number(cell) == value
            && subject.quantities().at(cell).kind() == subject.quantities().at(measure).kind());
  }
}
