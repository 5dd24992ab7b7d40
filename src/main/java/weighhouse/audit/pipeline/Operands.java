package weighhouse.audit.pipeline;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import weighhouse.audit.Finding;
import weighhouse.formula.Expr;
import weighhouse.formula.FormulaPrinter;
import weighhouse.formula.ReferenceResolver;
import weighhouse.formula.Trees;
import weighhouse.quantity.Quantity;
import weighhouse.recalculate.Values;
import weighhouse.rules.Match;
import weighhouse.rules.Subject;
import weighhouse.workbook.CellAddress;

/** The references of a matched formula in words. */
final class Operands {
  private Operands() {}

  /** The cell that an operand names, where it is a single reference. */
  static Optional<CellAddress> cellOf(Subject subject, Expr operand, CellAddress host) {
    return new ReferenceResolver(subject.workbook()).cell(Trees.inside(operand), host);
  }

  static List<Finding.Operand> of(Subject subject, Match match, Values values) {
    List<Finding.Operand> operands = new ArrayList<>();
    match
        .operands()
        .forEach((name, operand) -> operands.add(one(subject, operand, match.host(), values)));
    return operands;
  }

  private static Finding.Operand one(
      Subject subject, Expr operand, CellAddress host, Values values) {
    Quantity quantity = subject.quantities().of(operand, host);
    String label = cellOf(subject, operand, host).map(subject.quantities()::label).orElse("");
    return new Finding.Operand(
        FormulaPrinter.print(operand, host.row(), host.column()),
        label,
        quantity.kind().text(),
        Figures.of(subject.recalculation().evaluate(operand, host, values)));
  }
}
