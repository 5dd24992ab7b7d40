package weighhouse.recalculate.functions;

import weighhouse.recalculate.Value;
import weighhouse.workbook.A1;
import weighhouse.workbook.CellRange;

/** Functions about references, and those that answer with one. */
final class ReferenceFunctions {
  private ReferenceFunctions() {}

  static void enter(Entries entries) {
    entries.locating("INDEX", "RVvv", ReferenceFunctions::index, ReferenceFunctions::indexArray);
    entries.pointing("OFFSET", "NVVvv", ReferenceFunctions::offset);
    entries.pointing("INDIRECT", "Vv", ReferenceFunctions::indirect);
    entries.general("ADDRESS", "VVvvv", ReferenceFunctions::address);
    entries.general("ROW", "n", a -> counting(a, true));
    entries.general("COLUMN", "n", a -> counting(a, false));
    entries.general("ROWS", "N", a -> Coerce.of(rows(a)));
    entries.general("COLUMNS", "N", a -> Coerce.of(columns(a)));
    entries.general("AREAS", "N", a -> Coerce.of(a.reference(0).areas().size()));
  }

  private static int rows(Arguments a) {
    Reference reference = a.reference(0);
    return reference == null ? a.grid(0).rows() : reference.area().rows();
  }

  private static int columns(Arguments a) {
    Reference reference = a.reference(0);
    return reference == null ? a.grid(0).columns() : reference.area().columns();
  }

  private static Reference index(Arguments a) {
    Reference reference = a.reference(0);
    if (reference == null) {
      return null;
    }
    int areaNumber = a.integer(3, 1);
    if (areaNumber < 1 || areaNumber > reference.areas().size()) {
      throw Fault.REF.exception();
    }
    CellRange area = reference.areas().get(areaNumber - 1);
    int[] at = position(a, area.rows(), area.columns());
    CellRange rows = at[0] == 0 ? area : Ranges.row(area, at[0] - 1);
    return Reference.of(at[1] == 0 ? rows : Ranges.column(rows, at[1] - 1));
  }

  /** Row and column counted from 1, 0 for all; one index runs along a single row. */
  private static int[] position(Arguments a, int rows, int columns) {
    int row = a.integer(1, 0);
    int column = a.integer(2, 0);
    if (a.count() < 3 && rows == 1 && columns > 1) {
      column = row;
      row = 0;
    } else if (a.count() < 3 && columns == 1) {
      column = 1;
    }
    if (row < 0 || column < 0) {
      throw Fault.VALUE.exception();
    }
    if (row > rows || column > columns) {
      throw Fault.REF.exception();
    }
    return new int[] {row, column};
  }

  private static Value indexArray(Arguments a) {
    Grid grid = a.grid(0);
    int[] at = position(a, grid.rows(), grid.columns());
    int top = Math.max(0, at[0] - 1);
    int left = Math.max(0, at[1] - 1);
    Value[][] part = new Value[at[0] == 0 ? grid.rows() : 1][at[1] == 0 ? grid.columns() : 1];
    for (int r = 0; r < part.length; r++) {
      for (int c = 0; c < part[r].length; c++) {
        part[r][c] = grid.at(top + r, left + c);
      }
    }
    return part.length == 1 && part[0].length == 1 ? part[0][0] : new Value.Array(part);
  }

  private static Reference offset(Arguments a) {
    Reference reference = a.reference(0);
    if (reference == null) {
      throw Fault.VALUE.exception();
    }
    CellRange area = reference.area();
    long row = (long) area.firstRow() + a.integer(1, 0);
    long column = (long) area.firstColumn() + a.integer(2, 0);
    return Reference.of(
        Ranges.of(
            area.sheet(), row, column, a.integer(3, area.rows()), a.integer(4, area.columns())));
  }

  private static Reference indirect(Arguments a) {
    if (!a.logical(1, true)) {
      throw Fault.REF.exception();
    }
    Reference reference = a.surroundings().referenceOf(a.text(0));
    if (reference == null) {
      throw Fault.REF.exception();
    }
    return reference;
  }

  private static Value address(Arguments a) {
    int row = a.integer(0) - 1;
    int column = a.integer(1) - 1;
    int kind = a.integer(2, 1);
    if (row < 0 || row > Ranges.LAST_ROW || column < 0 || column > Ranges.LAST_COLUMN) {
      throw Fault.VALUE.exception();
    }
    String sheet = a.missing(4) ? "" : A1.sheet(a.text(4)) + "!";
    if (!a.logical(3, true)) {
      String r = kind <= 2 ? "R" + (row + 1) : "R[" + (row + 1) + "]";
      String c = kind % 2 == 1 ? "C" + (column + 1) : "C[" + (column + 1) + "]";
      return new Value.Text(sheet + r + c);
    }
    String letters = (kind % 2 == 1 ? "$" : "") + A1.column(column);
    return new Value.Text(sheet + letters + (kind <= 2 ? "$" : "") + (row + 1));
  }

  /** {@code $A$1} of zero-based indices. */
  static String address(int row, int column) {
    return "$" + A1.column(column) + "$" + (row + 1);
  }

  private static Value counting(Arguments a, boolean rows) {
    Reference reference = a.count() == 0 ? null : a.reference(0);
    if (a.count() > 0 && reference == null) {
      throw Fault.VALUE.exception();
    }
    CellRange area = reference == null ? CellRange.of(a.surroundings().host()) : reference.area();
    int first = rows ? area.firstRow() : area.firstColumn();
    int size = rows ? area.rows() : area.columns();
    if (size == 1) {
      return Coerce.of(first + 1.0);
    }
    Value[][] numbers = rows ? new Value[size][1] : new Value[1][size];
    for (int i = 0; i < size; i++) {
      numbers[rows ? i : 0][rows ? 0 : i] = new Value.Num(first + i + 1.0);
    }
    return new Value.Array(numbers);
  }
}
