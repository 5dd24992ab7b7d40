package weighhouse.rules.pattern;

import java.util.HashMap;
import java.util.Locale;
import java.util.Map;
import weighhouse.formula.Expr;
import weighhouse.formula.FormulaParser;
import weighhouse.formula.FormulaSyntaxException;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.DefinedName;
import weighhouse.workbook.Workbook;

/** What defined names stand for; a sheet's own name comes before the workbook's. */
final class Names {
  private record Key(int scope, String name) {}

  private final Workbook workbook;
  private final Map<Key, Expr> meanings = new HashMap<>();

  Names(Workbook workbook) {
    this.workbook = workbook;
    for (DefinedName name : workbook.names()) {
      Expr meaning = parsed(name.formula());
      if (meaning != null) {
        meanings.put(new Key(name.scope(), lower(name.name())), meaning);
      }
    }
  }

  /** The name's meaning, relative to the cell that uses it; null where it has none. */
  Expr meaning(Expr.NameRef name, CellAddress host) {
    boolean elsewhere = name.sheet() != null;
    int sheet = elsewhere ? workbook.sheetIndex(name.sheet().first()) : host.sheet();
    Expr own = meanings.get(new Key(sheet, lower(name.name())));
    return own != null
        ? own
        : meanings.get(new Key(DefinedName.WORKBOOK_SCOPE, lower(name.name())));
  }

  private static Expr parsed(String formula) {
    try {
      return FormulaParser.parse(formula, 0, 0).tree();
    } catch (FormulaSyntaxException brokenName) {
      return null; // the reader of the workbook reports broken names
    }
  }

  private static String lower(String name) {
    return name.toLowerCase(Locale.ROOT);
  }
}
