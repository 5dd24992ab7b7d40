package weighhouse.workbook;

import java.util.Arrays;

/**
 * The arrays of a cell store while they grow: one entry a cell in each, in the order of adding.
 * Kinds and roles take a byte each; their places in the enums never leave this class.
 */
@SuppressWarnings("EnumOrdinal")
final class Columns {
  private static final CellKind[] KINDS = CellKind.values();
  private static final FormulaRole[] ROLES = FormulaRole.values();

  int size;
  int[] row = new int[64];
  char[] column = new char[64];

  /** The number, 1 or 0 of a boolean, or the id of a text or an error's code. */
  double[] payload = new double[64];

  private byte[] kind = new byte[64];
  private byte[] role = new byte[64];
  char[] format = new char[64];

  /** 0 without a formula, id + 1 of a text of the cell's own, or the complement of a group. */
  int[] formula = new int[64];

  CellKind kind(int index) {
    return KINDS[kind[index]];
  }

  FormulaRole role(int index) {
    return ROLES[role[index]];
  }

  void setValue(int index, CellKind newKind, double newPayload) {
    kind[index] = (byte) newKind.ordinal();
    payload[index] = newPayload;
  }

  void setFormula(int index, FormulaRole newRole, int newFormula) {
    role[index] = (byte) newRole.ordinal();
    formula[index] = newFormula;
  }

  void reserve() {
    if (size < row.length) {
      return;
    }
    resize(Growth.atLeast(size, size + 1));
  }

  void trim() {
    resize(size);
  }

  private void resize(int length) {
    row = Arrays.copyOf(row, length);
    column = Arrays.copyOf(column, length);
    payload = Arrays.copyOf(payload, length);
    kind = Arrays.copyOf(kind, length);
    role = Arrays.copyOf(role, length);
    format = Arrays.copyOf(format, length);
    formula = Arrays.copyOf(formula, length);
  }

  /** Orders by row, then column; of several entries for one cell the last stays. */
  Columns sorted() {
    long[] keys = new long[size];
    for (int i = 0; i < size; i++) {
      keys[i] = ((long) row[i] << 14 | column[i]) << 29 | i;
    }
    Arrays.sort(keys);
    Columns sorted = new Columns();
    for (int k = 0; k < size; k++) {
      if (k + 1 == size || keys[k] >>> 29 != keys[k + 1] >>> 29) {
        sorted.copy(this, (int) (keys[k] & ((1 << 29) - 1)));
      }
    }
    return sorted;
  }

  private void copy(Columns from, int index) {
    reserve();
    row[size] = from.row[index];
    column[size] = from.column[index];
    payload[size] = from.payload[index];
    kind[size] = from.kind[index];
    role[size] = from.role[index];
    format[size] = from.format[index];
    formula[size] = from.formula[index];
    size++;
  }
}
