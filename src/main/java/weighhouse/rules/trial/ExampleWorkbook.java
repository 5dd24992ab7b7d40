package weighhouse.rules.trial;

import java.util.BitSet;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import weighhouse.formula.Expr;
import weighhouse.formula.FormulaParser;
import weighhouse.formula.FormulaPrinter;
import weighhouse.formula.FormulaSyntaxException;
import weighhouse.quantity.Declarations;
import weighhouse.quantity.Quantity;
import weighhouse.rules.file.Example;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.CellsBuilder;
import weighhouse.workbook.Sheet;
import weighhouse.workbook.Visibility;
import weighhouse.workbook.Workbook;

/**
 * An example as a workbook of one sheet.
 *
 * @param workbook the cells
 * @param declarations what the example says they are
 * @param tested the cells with the formula under test
 */
record ExampleWorkbook(Workbook workbook, Declarations declarations, CellRange tested) {
  /** What stands between a formula and the result that the file holds for it. */
  private static final String STORED = " stored ";

  static ExampleWorkbook of(Example example) {
    Filler filler = new Filler();
    example.cells().forEach((address, cell) -> filler.fill(Cells.range(address), cell));
    CellRange tested = Cells.range(example.at());
    filler.fill(tested, example.formula());
    Sheet sheet =
        new Sheet(
            "Model",
            Visibility.VISIBLE,
            filler.cells.build(),
            List.of(),
            List.of(),
            Map.of(),
            new BitSet(),
            new BitSet(),
            List.of());
    Workbook workbook =
        new Workbook(
            "example", "", List.of(sheet), List.of(), false, List.of(), List.of(), List.of());
    Declarations declarations = new Declarations(filler.declared, example.cycleYears());
    return new ExampleWorkbook(workbook, declarations, tested);
  }

  private static final class Filler {
    final CellsBuilder cells = new CellsBuilder();
    final Map<CellRange, Quantity> declared = new HashMap<>();

    void fill(CellRange range, Example.Cell cell) {
      if (cell.quantity() != null) {
        declared.put(range, cell.quantity());
      }
      int next = 0;
      for (int row = range.firstRow(); row <= range.lastRow(); row++) {
        for (int column = range.firstColumn(); column <= range.lastColumn(); column++) {
          if (!cell.content().isEmpty()) {
            String content = cell.content().get(next++ % cell.content().size());
            cells.begin(row, column, 0);
            put(content, range, row, column);
            cells.end();
          }
        }
      }
    }

    private void put(String content, CellRange range, int row, int column) {
      if (content.startsWith("=")) {
        String[] parts = content.split(STORED, 2);
        cells.formula(moved(parts[0], range, row, column));
        if (parts.length > 1) {
          cells.number(Double.parseDouble(parts[1]));
        }
      } else if (content.startsWith("'")) {
        cells.text(content.substring(1));
      } else {
        cells.number(Double.parseDouble(content));
      }
    }

    /** A formula of a range is written for its first cell and filled over the rest. */
    private static String moved(String formula, CellRange range, int row, int column) {
      try {
        Expr tree = FormulaParser.parse(formula, range.firstRow(), range.firstColumn()).tree();
        return FormulaPrinter.print(tree, row, column);
      } catch (FormulaSyntaxException e) {
        throw new IllegalArgumentException(formula + ": " + e.getMessage(), e);
      }
    }
  }
}
