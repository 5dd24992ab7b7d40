package weighhouse.formula;

import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import weighhouse.workbook.DefinedName;
import weighhouse.workbook.Workbook;

/**
 * Defined names as the cells of each sheet see them: a sheet's own name hides the workbook's. Name
 * formulas are parsed for cell A1, so that their relative references move with the host.
 */
public final class NameResolver {
  private record Key(int scope, String name) {}

  private final Workbook workbook;
  private final Map<Key, Expr> trees = new HashMap<>();

  public NameResolver(Workbook workbook) {
    this.workbook = workbook;
    for (DefinedName name : workbook.names()) {
      parse(name).ifPresent(tree -> trees.put(key(name.scope(), name.name()), tree));
    }
  }

  private static Optional<Expr> parse(DefinedName name) {
    try {
      return Optional.of(FormulaParser.parse(name.formula(), 0, 0).tree());
    } catch (FormulaSyntaxException e) {
      return Optional.empty();
    }
  }

  private static Key key(int scope, String name) {
    return new Key(scope, name.toUpperCase(Locale.ROOT));
  }

  /**
   * What a name stands for in a cell of that sheet, as a tree relative to the cell that uses it;
   * empty if there is no such name or its formula cannot be parsed.
   *
   * @param reference the name, qualified by a sheet or not
   * @param hostSheet zero-based sheet of the cell that uses it
   */
  public Optional<Expr> resolve(Expr.NameRef reference, int hostSheet) {
    SheetRef sheet = reference.sheet();
    if (sheet != null && sheet.workbook() != null) {
      return Optional.empty();
    }
    int scope = sheet == null ? hostSheet : workbook.sheetIndex(sheet.first());
    Expr own = trees.get(key(scope, reference.name()));
    return own != null
        ? Optional.of(own)
        : Optional.ofNullable(trees.get(key(DefinedName.WORKBOOK_SCOPE, reference.name())));
  }

  /** Names whose formula has lost what it referred to, or is no formula. */
  public List<DefinedName> broken() {
    return workbook.names().stream()
        .filter(
            name -> {
              Expr tree = trees.get(key(name.scope(), name.name()));
              return tree == null || Trees.contains(tree, NameResolver::isLostReference);
            })
        .toList();
  }

  private static boolean isLostReference(Expr node) {
    return node instanceof Expr.ErrorLiteral error && error.code().equals("#REF!");
  }
}
