package weighhouse.recalculate.program;

import java.util.List;
import weighhouse.formula.Axis;
import weighhouse.formula.Expr;
import weighhouse.recalculate.functions.Fault;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.Table;

/** Structured references, as seen from a host cell. */
final class TableReferences {
  private final Names names;
  private final CellAddress host;

  TableReferences(Names names, CellAddress host) {
    this.names = names;
    this.host = host;
  }

  Footprint of(Expr.TableRef reference) {
    Table table =
        reference.table().isEmpty() ? names.tableAt(host) : names.table(reference.table());
    if (table == null) {
      throw Fault.REF.exception();
    }
    CellRange range = table.range();
    int first = column(table, reference.firstColumn(), 0);
    int last =
        reference.lastColumn() == null && reference.firstColumn() != null
            ? first
            : column(table, reference.lastColumn(), table.columns().size() - 1);
    Axis left = new Axis(range.firstColumn() + Math.min(first, last), true);
    Axis right = new Axis(range.firstColumn() + Math.max(first, last), true);
    if (reference.specifiers().contains("#This Row")) {
      Axis own = new Axis(0, false);
      return new Footprint(range.sheet(), own, left, own, right);
    }
    int[] rows = rows(table, reference.specifiers());
    return new Footprint(
        range.sheet(), new Axis(rows[0], true), left, new Axis(rows[1], true), right);
  }

  private static int column(Table table, String name, int otherwise) {
    if (name == null) {
      return otherwise;
    }
    for (int i = 0; i < table.columns().size(); i++) {
      if (table.columns().get(i).equalsIgnoreCase(name)) {
        return i;
      }
    }
    throw Fault.REF.exception();
  }

  private static int[] rows(Table table, List<String> specifiers) {
    CellRange range = table.range();
    int firstData = range.firstRow() + table.headerRows();
    int lastData = range.lastRow() - table.totalsRows();
    boolean all = specifiers.contains("#All");
    boolean headers = all || specifiers.contains("#Headers");
    boolean totals = all || specifiers.contains("#Totals");
    boolean data = all || specifiers.contains("#Data") || specifiers.isEmpty();
    int first = headers ? range.firstRow() : data ? firstData : lastData + 1;
    int last = totals ? range.lastRow() : data ? lastData : firstData - 1;
    if (first > last) {
      throw Fault.REF.exception();
    }
    return new int[] {first, last};
  }
}
