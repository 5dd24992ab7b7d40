package weighhouse.audit.pipeline;

import java.util.Optional;
import weighhouse.formula.FormulaParser;
import weighhouse.formula.FormulaSyntaxException;
import weighhouse.formula.ReferenceResolver;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.Workbook;

/** Ranges as people write them in a brief: {@code Inputs!B3:B9}, or a defined name. */
final class A1Text {
  private A1Text() {}

  /** The range that the text names; empty where the workbook has none such. */
  static Optional<CellRange> range(Workbook workbook, String text) {
    try {
      CellAddress host = new CellAddress(0, 0, 0);
      return new ReferenceResolver(workbook).range(FormulaParser.parse(text, 0, 0).tree(), host);
    } catch (FormulaSyntaxException e) {
      return Optional.empty();
    }
  }
}
