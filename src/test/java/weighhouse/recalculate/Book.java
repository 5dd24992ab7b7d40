package weighhouse.recalculate;

import java.util.LinkedHashMap;
import java.util.Map;
import weighhouse.formula.FormulaParser;
import weighhouse.formula.FormulaSyntaxException;
import weighhouse.formula.ShapeIndex;
import weighhouse.recalculate.engine.Recalculations;
import weighhouse.workbook.A1;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.UnreadableWorkbookException;
import weighhouse.workbook.Workbook;
import weighhouse.workbook.file.WorkbookReader;

/** A small workbook made by a test, written as a file, read and calculated as any other. */
public final class Book {
  private final BookFile file = new BookFile();
  private String sheet = "Sheet1";
  private Workbook workbook;
  private Recalculation recalculation;

  public Book() {
    file.sheet(sheet);
  }

  /** Later cells go to this sheet. */
  public Book sheet(String name) {
    sheet = name;
    file.sheet(name);
    return this;
  }

  /**
   * Sets a cell; text that starts with = is a formula, with {= an array formula over the cells
   * given.
   */
  public Book set(String cells, Object value) {
    file.set(sheet, cells, value, null);
    return this;
  }

  /** Sets a formula with a stored value. */
  public Book set(String cell, String formula, Object stored) {
    file.set(sheet, cell, formula, stored);
    return this;
  }

  /** Defines a name for the workbook, or (as {@code Sheet1!name}) for a sheet. */
  public Book name(String name, String refersTo) {
    file.name(name, refersTo);
    return this;
  }

  /** Makes a table with a header row. */
  public Book table(String name, String range, String... columns) {
    file.table(sheet, name, range, columns);
    return this;
  }

  /** Days count from 1904. */
  public Book date1904() {
    file.date1904();
    return this;
  }

  public byte[] bytes() {
    return file.bytes();
  }

  public Workbook workbook() {
    if (workbook == null) {
      try {
        workbook = WorkbookReader.read(file.bytes(), "book.xlsx");
      } catch (UnreadableWorkbookException e) {
        throw new IllegalStateException(e);
      }
    }
    return workbook;
  }

  public Recalculation recalculation() {
    if (recalculation == null) {
      recalculation = Recalculations.compile(workbook(), ShapeIndex.of(workbook()));
    }
    return recalculation;
  }

  /** Address of {@code B3} on the first sheet, or of {@code Other!B3}. */
  public CellAddress address(String cell) {
    int bang = cell.indexOf('!');
    int index = bang < 0 ? 0 : workbook().sheetIndex(cell.substring(0, bang));
    String letters = cell.substring(bang + 1).replaceAll("[0-9]", "");
    int row = Integer.parseInt(cell.substring(bang + 1 + letters.length())) - 1;
    return new CellAddress(index, row, A1.column(letters));
  }

  public Value value(String cell) {
    return value(recalculation().base(), cell);
  }

  public Value value(Values values, String cell) {
    return values.at(address(cell));
  }

  /** The number in a cell, NaN where there is none. */
  public double number(String cell) {
    return number(recalculation().base(), cell);
  }

  public double number(Values values, String cell) {
    return value(values, cell) instanceof Value.Num n ? n.value() : Double.NaN;
  }

  /** The workbook with one number set otherwise. */
  public Values whatIf(String cell, double number) {
    return recalculation().whatIf(Change.of(address(cell), number));
  }

  /** The workbook with other formulas in some cells. */
  public Values whatIf(Map<String, String> formulas) {
    Map<weighhouse.workbook.CellRange, weighhouse.formula.Expr> replaced = new LinkedHashMap<>();
    formulas.forEach(
        (cell, formula) ->
            replaced.put(
                weighhouse.workbook.CellRange.of(address(cell)), tree(formula, address(cell))));
    return recalculation().whatIf(new Change(Map.of(), replaced));
  }

  private static weighhouse.formula.Expr tree(String formula, CellAddress host) {
    try {
      return FormulaParser.parse(formula, host.row(), host.column()).tree();
    } catch (FormulaSyntaxException e) {
      throw new IllegalArgumentException(formula, e);
    }
  }

  /** What a formula gives in a cell. */
  public Value formula(String formula, String cell) {
    CellAddress host = address(cell);
    return recalculation().evaluate(tree(formula, host), host, recalculation().base());
  }
}
