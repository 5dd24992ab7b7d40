package weighhouse.formula;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.Workbook;

/**
 * From references of a tree to the cells they mean for a host. Sheets of other workbooks, deleted
 * ones, and references that have to be computed resolve to nothing.
 */
public final class ReferenceResolver {
  /** Names may stand for names; more steps than this are a circle. */
  private static final int MAX_NAME_STEPS = 16;

  private final Workbook workbook;
  private final NameResolver names;
  private final TableResolver tables;

  public ReferenceResolver(Workbook workbook) {
    this.workbook = workbook;
    this.names = new NameResolver(workbook);
    this.tables = new TableResolver(workbook);
  }

  public NameResolver names() {
    return names;
  }

  /**
   * The one cell that an expression means in the host: a reference to a cell, a name for one, or a
   * column, row or line of cells of which implicit intersection picks one.
   */
  public Optional<CellAddress> cell(Expr node, CellAddress host) {
    return range(node, host).flatMap(range -> intersect(range, host));
  }

  /**
   * The rectangle an expression means in the host, if it is a plain reference or a name for one.
   */
  public Optional<CellRange> range(Expr node, CellAddress host) {
    return range(node, host, 0);
  }

  private Optional<CellRange> range(Expr node, CellAddress host, int steps) {
    if (node instanceof Expr.Paren paren) {
      return range(paren.inner(), host, steps);
    } else if (node instanceof Expr.Unary unary && unary.op() == UnaryOp.AT) {
      return range(unary.operand(), host, steps)
          .flatMap(range -> intersect(range, host))
          .map(CellRange::of);
    } else if (node instanceof Expr.NameRef name && steps < MAX_NAME_STEPS) {
      return names.resolve(name, host.sheet()).flatMap(tree -> range(tree, host, steps + 1));
    } else if (node instanceof Expr.Binary binary && binary.op() == BinaryOp.RANGE) {
      return hull(range(binary.left(), host, steps), range(binary.right(), host, steps));
    } else if (node instanceof Expr.TableRef table) {
      return tables.range(table, host);
    }
    return written(node, host);
  }

  private Optional<CellRange> written(Expr node, CellAddress host) {
    if (node instanceof Expr.CellRef cell) {
      return rectangle(cell.sheet(), host, cell.row(), cell.column(), cell.row(), cell.column());
    } else if (node instanceof Expr.AreaRef area) {
      return rectangle(
          area.sheet(), host, area.row1(), area.column1(), area.row2(), area.column2());
    } else if (node instanceof Expr.ColumnsRef columns) {
      return rectangle(
          columns.sheet(),
          host,
          new Axis(0, true),
          columns.first(),
          new Axis(ReferenceReader.ROWS - 1, true),
          columns.last());
    } else if (node instanceof Expr.RowsRef rows) {
      return rectangle(
          rows.sheet(),
          host,
          rows.first(),
          new Axis(0, true),
          rows.last(),
          new Axis(ReferenceReader.COLUMNS - 1, true));
    }
    return Optional.empty();
  }

  private Optional<CellRange> rectangle(
      SheetRef sheet, CellAddress host, Axis row1, Axis column1, Axis row2, Axis column2) {
    int index = sheet(sheet, host);
    if (index < 0) {
      return Optional.empty();
    }
    int r1 = Math.floorMod(row1.resolve(host.row()), ReferenceReader.ROWS);
    int r2 = Math.floorMod(row2.resolve(host.row()), ReferenceReader.ROWS);
    int c1 = Math.floorMod(column1.resolve(host.column()), ReferenceReader.COLUMNS);
    int c2 = Math.floorMod(column2.resolve(host.column()), ReferenceReader.COLUMNS);
    return Optional.of(
        new CellRange(
            index, Math.min(r1, r2), Math.min(c1, c2), Math.max(r1, r2), Math.max(c1, c2)));
  }

  private int sheet(SheetRef sheet, CellAddress host) {
    if (sheet == null) {
      return host.sheet();
    }
    return sheet.workbook() != null || sheet.last() != null
        ? -1
        : workbook.sheetIndex(sheet.first());
  }

  private static Optional<CellRange> hull(Optional<CellRange> a, Optional<CellRange> b) {
    return a.flatMap(
        left ->
            b.filter(right -> right.sheet() == left.sheet())
                .map(
                    right ->
                        new CellRange(
                            left.sheet(),
                            Math.min(left.firstRow(), right.firstRow()),
                            Math.min(left.firstColumn(), right.firstColumn()),
                            Math.max(left.lastRow(), right.lastRow()),
                            Math.max(left.lastColumn(), right.lastColumn()))));
  }

  /** Implicit intersection: the range's cell in the host's row or column. */
  private static Optional<CellAddress> intersect(CellRange range, CellAddress host) {
    boolean inRow = range.firstRow() <= host.row() && host.row() <= range.lastRow();
    boolean inColumn = range.firstColumn() <= host.column() && host.column() <= range.lastColumn();
    if (range.size() == 1) {
      return Optional.of(range.first());
    } else if (range.columns() == 1 && inRow) {
      return Optional.of(new CellAddress(range.sheet(), host.row(), range.firstColumn()));
    } else if (range.rows() == 1 && inColumn) {
      return Optional.of(new CellAddress(range.sheet(), range.firstRow(), host.column()));
    }
    return Optional.empty();
  }

  /**
   * Every rectangle that a tree reads, from left to right, with those that names stand for and all
   * sheets of 3-D references; what has to be computed (OFFSET, INDIRECT) is not among them.
   */
  public List<CellRange> ranges(Expr tree, CellAddress host) {
    List<CellRange> found = new ArrayList<>();
    collect(tree, host, found, 0);
    return found;
  }

  private void collect(Expr tree, CellAddress host, List<CellRange> found, int steps) {
    for (Expr node : Trees.walk(tree)) {
      SheetRef sheet = sheetOf(node);
      if (sheet != null && sheet.last() != null && sheet.workbook() == null) {
        acrossSheets(node, sheet, host, found);
      } else if (node instanceof Expr.NameRef name) {
        if (steps < MAX_NAME_STEPS) {
          names
              .resolve(name, host.sheet())
              .ifPresent(named -> collect(named, host, found, steps + 1));
        }
      } else if (node instanceof Expr.Binary binary && binary.op() == BinaryOp.RANGE) {
        range(binary, host).ifPresent(found::add);
      } else if (Trees.children(node).isEmpty()) {
        range(node, host).ifPresent(found::add);
      }
    }
  }

  private void acrossSheets(Expr node, SheetRef sheets, CellAddress host, List<CellRange> found) {
    int first = workbook.sheetIndex(sheets.first());
    int last = workbook.sheetIndex(sheets.last());
    for (int sheet = Math.max(0, first); first >= 0 && sheet <= last; sheet++) {
      CellAddress there = new CellAddress(sheet, host.row(), host.column());
      written(onOwnSheet(node), there).ifPresent(found::add);
    }
  }

  private static SheetRef sheetOf(Expr node) {
    if (node instanceof Expr.CellRef cell) {
      return cell.sheet();
    } else if (node instanceof Expr.AreaRef area) {
      return area.sheet();
    } else if (node instanceof Expr.ColumnsRef columns) {
      return columns.sheet();
    }
    return node instanceof Expr.RowsRef rows ? rows.sheet() : null;
  }

  private static Expr onOwnSheet(Expr node) {
    if (node instanceof Expr.CellRef cell) {
      return new Expr.CellRef(null, cell.row(), cell.column());
    } else if (node instanceof Expr.AreaRef area) {
      return new Expr.AreaRef(null, area.row1(), area.column1(), area.row2(), area.column2());
    } else if (node instanceof Expr.ColumnsRef columns) {
      return new Expr.ColumnsRef(null, columns.first(), columns.last());
    }
    Expr.RowsRef rows = (Expr.RowsRef) node;
    return new Expr.RowsRef(null, rows.first(), rows.last());
  }
}
