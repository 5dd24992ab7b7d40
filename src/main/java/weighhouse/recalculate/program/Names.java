package weighhouse.recalculate.program;

import java.util.HashMap;
import java.util.Locale;
import java.util.Map;
import weighhouse.formula.Expr;
import weighhouse.formula.FormulaParser;
import weighhouse.formula.FormulaSyntaxException;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.DefinedName;
import weighhouse.workbook.Table;
import weighhouse.workbook.Workbook;

/** What the names of a workbook stand for: defined names by scope, tables, sheets. */
public final class Names {
  private record Key(int scope, String name) {}

  private final Workbook workbook;
  private final Map<Key, Expr> defined = new HashMap<>();
  private final Map<String, Table> tables = new HashMap<>();
  private final Map<String, Integer> sheets = new HashMap<>();

  public Names(Workbook workbook) {
    this.workbook = workbook;
    for (DefinedName name : workbook.names()) {
      defined.put(new Key(name.scope(), folded(name.name())), tree(name));
    }
    for (int i = workbook.sheets().size() - 1; i >= 0; i--) {
      sheets.put(folded(workbook.sheet(i).name()), i);
      workbook.sheet(i).tables().forEach(table -> tables.put(folded(table.name()), table));
    }
  }

  /** References of a name are relative to cell A1. */
  private static Expr tree(DefinedName name) {
    try {
      return FormulaParser.parse(name.formula(), 0, 0).tree();
    } catch (FormulaSyntaxException e) {
      return new Expr.ErrorLiteral("#NAME?");
    }
  }

  private static String folded(String name) {
    return name.toLowerCase(Locale.ROOT);
  }

  Workbook workbook() {
    return workbook;
  }

  /** Index of a sheet, or -1. */
  int sheet(String name) {
    return sheets.getOrDefault(folded(name), -1);
  }

  /** What a name stands for as seen from a sheet: the sheet's own name first; null if unknown. */
  Expr find(String name, int sheet) {
    Expr own = defined.get(new Key(sheet, folded(name)));
    return own != null ? own : defined.get(new Key(DefinedName.WORKBOOK_SCOPE, folded(name)));
  }

  Table table(String name) {
    return tables.get(folded(name.substring(name.lastIndexOf('!') + 1)));
  }

  /** The table that holds a cell, or null. */
  public Table tableAt(CellAddress cell) {
    return workbook.sheet(cell.sheet()).tables().stream()
        .filter(table -> table.range().contains(cell))
        .findFirst()
        .orElse(null);
  }
}
