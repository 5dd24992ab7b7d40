package weighhouse.recalculate.functions;

import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.SingularMatrixException;
import weighhouse.recalculate.Value;

/** Matrices. */
final class Matrices {
  private Matrices() {}

  static void enter(Entries entries) {
    entries.general("MMULT", "AA", a -> product(of(a.grid(0)), of(a.grid(1))));
    entries.general("MINVERSE", "A", a -> inverse(square(a.grid(0))));
    entries.general(
        "MDETERM", "A", a -> Coerce.of(new LUDecomposition(square(a.grid(0)), 0).getDeterminant()));
    entries.general("TRANSPOSE", "A", a -> transposed(a.grid(0)));
    entries.general("MUNIT", "V", a -> unit(a.integer(0)));
  }

  /** The numbers of a rectangle; {@code #VALUE!} where one is missing. */
  static double[][] of(Grid grid) {
    double[][] rows = new double[grid.rows()][grid.columns()];
    for (int r = 0; r < rows.length; r++) {
      for (int c = 0; c < rows[r].length; c++) {
        rows[r][c] = grid.number(r, c);
        if (Double.isNaN(rows[r][c])) {
          Coerce.sound(grid.at(r, c));
          throw Fault.VALUE.exception();
        }
      }
    }
    return rows;
  }

  static Value.Array array(double[][] rows) {
    Value[][] values = new Value[rows.length][];
    for (int r = 0; r < rows.length; r++) {
      values[r] = new Value[rows[r].length];
      for (int c = 0; c < rows[r].length; c++) {
        values[r][c] = Coerce.of(rows[r][c]);
      }
    }
    return new Value.Array(values);
  }

  private static Value product(double[][] a, double[][] b) {
    if (a[0].length != b.length) {
      throw Fault.VALUE.exception();
    }
    double[][] product = new double[a.length][b[0].length];
    for (int r = 0; r < a.length; r++) {
      for (int c = 0; c < b[0].length; c++) {
        double sum = 0;
        for (int k = 0; k < b.length; k++) {
          sum += a[r][k] * b[k][c];
        }
        product[r][c] = sum;
      }
    }
    return array(product);
  }

  private static Array2DRowRealMatrix square(Grid grid) {
    if (grid.rows() != grid.columns()) {
      throw Fault.VALUE.exception();
    }
    return new Array2DRowRealMatrix(of(grid));
  }

  private static Value inverse(Array2DRowRealMatrix matrix) {
    try {
      return array(new LUDecomposition(matrix).getSolver().getInverse().getData());
    } catch (SingularMatrixException e) {
      return Fault.NUM.value();
    }
  }

  private static Value transposed(Grid grid) {
    Value[][] rows = new Value[grid.columns()][grid.rows()];
    for (int r = 0; r < rows.length; r++) {
      for (int c = 0; c < rows[r].length; c++) {
        rows[r][c] = grid.at(c, r);
      }
    }
    return new Value.Array(rows);
  }

  private static Value unit(int size) {
    if (size < 1) {
      throw Fault.VALUE.exception();
    }
    double[][] rows = new double[size][size];
    for (int i = 0; i < size; i++) {
      rows[i][i] = 1;
    }
    return array(rows);
  }
}
