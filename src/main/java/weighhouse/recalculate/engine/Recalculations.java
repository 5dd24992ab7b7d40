package weighhouse.recalculate.engine;

import weighhouse.formula.Shapes;
import weighhouse.recalculate.Recalculation;
import weighhouse.workbook.Workbook;

/** Where calculation starts. */
public final class Recalculations {
  private Recalculations() {}

  /**
   * Compiles a workbook's formulas, runs them once and compares with the stored values. Formulas
   * that cannot be run, or do not give the stored values, keep those; {@link
   * Recalculation#replay()} tells which.
   */
  public static Recalculation compile(Workbook workbook, Shapes shapes) {
    return new Engine(Model.of(workbook, shapes));
  }
}
