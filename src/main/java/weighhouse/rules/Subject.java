package weighhouse.rules;

import weighhouse.formula.Shapes;
import weighhouse.quantity.Quantities;
import weighhouse.recalculate.Recalculation;
import weighhouse.workbook.Workbook;

/** All that rules look at: the workbook, its formulas, what its numbers mean, and how it runs. */
public record Subject(
    Workbook workbook, Shapes shapes, Quantities quantities, Recalculation recalculation) {}
