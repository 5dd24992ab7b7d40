package weighhouse.quantity.inference;

import java.util.Set;
import java.util.function.Predicate;
import weighhouse.formula.Expr;
import weighhouse.formula.Region;
import weighhouse.formula.Shape;
import weighhouse.formula.Shapes;
import weighhouse.quantity.Declarations;
import weighhouse.quantity.label.Headings;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellKind;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.Workbook;

/** Gathers cells into units: lines of one formula, or of numbers, that no label sets apart. */
final class UnitFinder {
  private final Workbook workbook;
  private final Shapes shapes;
  private final Headings headings;
  private final Set<CellRange> declared;
  private final Units units;

  private UnitFinder(
      Workbook workbook, Shapes shapes, Headings headings, Declarations declarations) {
    this.workbook = workbook;
    this.shapes = shapes;
    this.headings = headings;
    this.declared = declarations.quantities().keySet();
    this.units = new Units(workbook);
  }

  static Units find(
      Workbook workbook, Shapes shapes, Headings headings, Declarations declarations) {
    UnitFinder finder = new UnitFinder(workbook, shapes, headings, declarations);
    shapes.regions().forEach(finder::region);
    for (int sheet = 0; sheet < workbook.sheets().size(); sheet++) {
      finder.numbers(sheet);
    }
    return finder.units;
  }

  private void region(Region region) {
    Shape shape = shapes.all().get(region.shape());
    CellRange range = region.range();
    if (shape.array()) {
      units.add(range, shape.tree());
    } else if (range.rows() >= range.columns()) {
      for (int column = range.firstColumn(); column <= range.lastColumn(); column++) {
        down(range, column, shape.tree());
      }
    } else {
      for (int row = range.firstRow(); row <= range.lastRow(); row++) {
        across(range, row, shape.tree());
      }
    }
  }

  private void down(CellRange range, int column, Expr tree) {
    Predicate<Integer> apart =
        row ->
            isApart(
                new CellAddress(range.sheet(), row, column),
                tree == null ? headings::hasText : headings::isLabelled);
    lines(
        range.firstRow(),
        range.lastRow(),
        apart,
        (first, last) ->
            units.add(new CellRange(range.sheet(), first, column, last, column), tree));
  }

  private void across(CellRange range, int row, Expr tree) {
    Predicate<Integer> apart =
        column -> isApart(new CellAddress(range.sheet(), row, column), headings::isHeaded);
    lines(
        range.firstColumn(),
        range.lastColumn(),
        apart,
        (first, last) -> units.add(new CellRange(range.sheet(), row, first, row, last), tree));
  }

  private boolean isApart(CellAddress cell, Predicate<CellAddress> labelled) {
    return labelled.test(cell) || declared.stream().anyMatch(range -> range.contains(cell));
  }

  private interface Line {
    void take(int first, int last);
  }

  /** Cuts a line into cells that stand for themselves and what is left between them. */
  private static void lines(int from, int to, Predicate<Integer> apart, Line line) {
    int first = from;
    for (int at = from; at <= to; at++) {
      if (apart.test(at)) {
        if (at > first) {
          line.take(first, at - 1);
        }
        line.take(at, at);
        first = at + 1;
      }
    }
    if (first <= to) {
      line.take(first, to);
    }
  }

  /** Typed-in numbers, and formulas that could not be parsed, gathered down the columns. */
  private void numbers(int sheet) {
    CellStore cells = workbook.sheet(sheet).cells();
    for (int i = 0; i < cells.size(); i++) {
      if (!units.isTaken(sheet, i) && isNumber(cells, i)) {
        int column = cells.column(i);
        int last = lastOfRun(sheet, cells, cells.row(i), column);
        CellRange run = new CellRange(sheet, cells.row(i), column, last, column);
        down(run, column, null);
      }
    }
  }

  private int lastOfRun(int sheet, CellStore cells, int first, int column) {
    int row = first;
    int next = cells.find(row + 1, column);
    while (next >= 0 && !units.isTaken(sheet, next) && isNumber(cells, next)) {
      row++;
      next = cells.find(row + 1, column);
    }
    return row;
  }

  private static boolean isNumber(CellStore cells, int index) {
    CellKind kind = cells.kind(index);
    return kind == CellKind.NUMBER
        || cells.hasFormula(index)
        || (kind == CellKind.TEXT && NumberText.isNumber(cells.text(index)));
  }
}
