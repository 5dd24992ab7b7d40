package weighhouse.recalculate.program;

import java.util.ArrayList;
import java.util.List;
import weighhouse.formula.Axis;
import weighhouse.formula.Expr;
import weighhouse.formula.SheetRef;
import weighhouse.recalculate.functions.Fault;
import weighhouse.workbook.CellAddress;

/** Turns the references of a tree into footprints, as seen from a host cell. */
final class References {
  private static final Axis FIRST = new Axis(0, true);
  private static final Axis LAST_ROW = new Axis(Footprint.ROWS - 1, true);
  private static final Axis LAST_COLUMN = new Axis(Footprint.COLUMNS - 1, true);

  private final Names names;
  private final CellAddress host;

  References(Names names, CellAddress host) {
    this.names = names;
    this.host = host;
  }

  /**
   * Footprints of a reference: one, or one for each sheet of a 3-D reference.
   *
   * @return null where the tree is no plain reference
   * @throws weighhouse.recalculate.functions.FaultException where it points at nothing
   */
  List<Footprint> of(Expr tree) {
    if (tree instanceof Expr.CellRef cell) {
      return on(cell.sheet(), cell.row(), cell.column(), cell.row(), cell.column());
    } else if (tree instanceof Expr.AreaRef area) {
      return on(area.sheet(), area.row1(), area.column1(), area.row2(), area.column2());
    } else if (tree instanceof Expr.ColumnsRef columns) {
      return on(columns.sheet(), FIRST, columns.first(), LAST_ROW, columns.last());
    } else if (tree instanceof Expr.RowsRef rows) {
      return on(rows.sheet(), rows.first(), FIRST, rows.last(), LAST_COLUMN);
    } else if (tree instanceof Expr.TableRef table) {
      return List.of(new TableReferences(names, host).of(table));
    } else if (tree instanceof Expr.NameRef name) {
      return ofName(name);
    }
    return tree instanceof Expr.Paren paren ? of(paren.inner()) : null;
  }

  private List<Footprint> ofName(Expr.NameRef name) {
    Expr meaning = names.find(name.name(), scope(name));
    if (meaning == null && names.table(name.name()) != null) {
      return of(new Expr.TableRef(name.name(), List.of(), null, null));
    }
    boolean named = meaning instanceof Expr.NameRef other && other.name().equals(name.name());
    return meaning == null || named ? null : of(meaning);
  }

  /** Sheet whose names a name is looked up among. */
  int scope(Expr.NameRef name) {
    if (name.sheet() == null) {
      return host.sheet();
    }
    if (name.sheet().workbook() != null) {
      throw new UnsupportedFormulaException("external link");
    }
    return names.sheet(name.sheet().first());
  }

  private List<Footprint> on(SheetRef sheet, Axis row1, Axis column1, Axis row2, Axis column2) {
    List<Footprint> footprints = new ArrayList<>();
    for (int index : sheets(sheet)) {
      footprints.add(new Footprint(index, row(row1), column(column1), row(row2), column(column2)));
    }
    return footprints;
  }

  /** An offset of nearly a whole sheet is one back over the edge, as relative names have them. */
  private static Axis row(Axis axis) {
    return near(axis, Footprint.ROWS);
  }

  private static Axis column(Axis axis) {
    return near(axis, Footprint.COLUMNS);
  }

  private static Axis near(Axis axis, int size) {
    if (axis.absolute() || Math.abs(axis.value()) <= size / 2) {
      return axis;
    }
    return new Axis(axis.value() - Integer.signum(axis.value()) * size, false);
  }

  private int[] sheets(SheetRef sheet) {
    if (sheet == null) {
      return new int[] {host.sheet()};
    }
    if (sheet.workbook() != null) {
      throw new UnsupportedFormulaException("external link");
    }
    int first = names.sheet(sheet.first());
    int last = sheet.last() == null ? first : names.sheet(sheet.last());
    if (first < 0 || last < 0) {
      throw Fault.REF.exception();
    }
    int from = Math.min(first, last);
    int[] indices = new int[Math.abs(last - first) + 1];
    for (int i = 0; i < indices.length; i++) {
      indices[i] = from + i;
    }
    return indices;
  }
}
