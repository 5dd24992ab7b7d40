package weighhouse.quantity.inference;

import java.util.List;
import java.util.Optional;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.ReferenceResolver;
import weighhouse.formula.Trees;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellKind;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.Workbook;

/** The cells that lookups mean: one where the key is written, else the column it is taken from. */
final class Lookups {
  /** Longer keys lists are data, not parameters. */
  private static final int LONGEST_LIST = 20_000;

  private static final int UNKNOWN = -1;

  private final Workbook workbook;
  private final ReferenceResolver resolver;

  Lookups(Workbook workbook, ReferenceResolver resolver) {
    this.workbook = workbook;
    this.resolver = resolver;
  }

  Optional<CellRange> cells(Expr.Call call, CellAddress host) {
    List<Expr> arguments = call.arguments();
    return switch (call.function()) {
      case "VLOOKUP" -> table(arguments, host, true);
      case "HLOOKUP" -> table(arguments, host, false);
      case "XLOOKUP", "LOOKUP" -> parallel(arguments, host);
      case "INDEX" -> index(arguments, host);
      default -> Optional.empty();
    };
  }

  private Optional<CellRange> table(List<Expr> arguments, CellAddress host, boolean down) {
    Optional<CellRange> table = area(arguments, 1, host);
    int line = position(arguments, 2, host);
    if (table.isEmpty() || line == UNKNOWN) {
      return Optional.empty();
    }
    CellRange keys = line(table.get(), 0, down);
    CellRange values = line(table.get(), line - 1, down);
    return picked(values, keys, text(arguments.get(0), host));
  }

  private Optional<CellRange> parallel(List<Expr> arguments, CellAddress host) {
    Optional<CellRange> keys = area(arguments, 1, host);
    Optional<CellRange> values = area(arguments, 2, host);
    return keys.isEmpty() || values.isEmpty()
        ? Optional.empty()
        : picked(values.get(), keys.get(), text(arguments.get(0), host));
  }

  private Optional<CellRange> index(List<Expr> arguments, CellAddress host) {
    Optional<CellRange> area = area(arguments, 0, host);
    if (area.isEmpty()) {
      return Optional.empty();
    }
    CellRange range = area.get();
    boolean row = range.rows() == 1 && arguments.size() == 2;
    int down = row ? 1 : position(arguments, 1, host);
    int across = position(arguments, row ? 1 : 2, host);
    if (range.columns() == 1) {
      across = 1;
    }
    CellRange lines = across > 0 ? line(range, across - 1, true) : range;
    return Optional.of(down > 0 ? line(lines, down - 1, false) : lines);
  }

  private Optional<CellRange> area(List<Expr> arguments, int index, CellAddress host) {
    return index < arguments.size() ? resolver.range(arguments.get(index), host) : Optional.empty();
  }

  /** One column (or row) of a range, counted from 0. */
  private static CellRange line(CellRange range, int at, boolean column) {
    return column
        ? new CellRange(
            range.sheet(),
            range.firstRow(),
            range.firstColumn() + at,
            range.lastRow(),
            range.firstColumn() + at)
        : new CellRange(
            range.sheet(),
            range.firstRow() + at,
            range.firstColumn(),
            range.firstRow() + at,
            range.lastColumn());
  }

  private Optional<CellRange> picked(CellRange values, CellRange keys, String key) {
    int at = key == null ? UNKNOWN : find(keys, key);
    if (at == UNKNOWN) {
      return Optional.of(values);
    }
    CellAddress first = values.first();
    boolean down = keys.columns() == 1;
    return Optional.of(CellRange.of(down ? first.offset(at, 0) : first.offset(0, at)));
  }

  private int find(CellRange keys, String key) {
    CellStore cells = workbook.sheet(keys.sheet()).cells();
    boolean down = keys.columns() == 1;
    int length = down ? Math.min(keys.rows(), cells.rows()) : keys.columns();
    for (int i = 0; i < Math.min(length, LONGEST_LIST); i++) {
      CellAddress at = down ? keys.first().offset(i, 0) : keys.first().offset(0, i);
      String text = text(at);
      if (text != null && text.strip().equalsIgnoreCase(key.strip())) {
        return i;
      }
    }
    return UNKNOWN;
  }

  /** The text that an expression gives: written, in a cell, or joined of such; null if unknown. */
  private String text(Expr node, CellAddress host) {
    Expr inner = Trees.inside(node);
    if (inner instanceof Expr.Str text) {
      return text.value();
    } else if (inner instanceof Expr.Binary join && join.op() == BinaryOp.CONCATENATE) {
      String left = text(join.left(), host);
      String right = text(join.right(), host);
      return left == null || right == null ? null : left + right;
    }
    return resolver.cell(inner, host).map(this::text).orElse(null);
  }

  private String text(CellAddress cell) {
    CellStore cells = workbook.sheet(cell.sheet()).cells();
    int index = cells.find(cell.row(), cell.column());
    return index >= 0 && cells.kind(index) == CellKind.TEXT ? cells.text(index) : null;
  }

  /** A row or column number, counted from 1: written, or matched by a literal key. */
  private int position(List<Expr> arguments, int index, CellAddress host) {
    if (index >= arguments.size()) {
      return UNKNOWN;
    }
    Expr node = Trees.inside(arguments.get(index));
    if (node instanceof Expr.Num number) {
      return (int) number.value();
    } else if (node instanceof Expr.Call match && match.function().equals("MATCH")) {
      Optional<CellRange> keys = area(match.arguments(), 1, host);
      String key = text(match.arguments().get(0), host);
      int at = key == null || keys.isEmpty() ? UNKNOWN : find(keys.get(), key);
      return at == UNKNOWN ? UNKNOWN : at + 1;
    }
    return UNKNOWN;
  }
}
