package weighhouse.recalculate.functions;

import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.MatrixUtils;
import org.apache.commons.math3.linear.QRDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.RealVector;
import org.apache.commons.math3.linear.SingularMatrixException;
import weighhouse.recalculate.Value;

/** Linear regression on several variables, as LINEST and its kin need it. */
final class LeastSquares {
  private final RealMatrix design;
  private final double[] y;
  private final boolean intercept;
  private final double[] coefficients;

  private LeastSquares(double[][] xs, double[] y, boolean intercept) {
    this.design = new Array2DRowRealMatrix(withOnes(xs, intercept));
    this.y = y;
    this.intercept = intercept;
    try {
      this.coefficients =
          new QRDecomposition(design, 1e-12)
              .getSolver()
              .solve(MatrixUtils.createRealVector(y))
              .toArray();
    } catch (SingularMatrixException e) {
      throw Fault.NUM.exception();
    }
  }

  private static double[][] withOnes(double[][] xs, boolean intercept) {
    double[][] rows = new double[xs.length][];
    for (int i = 0; i < xs.length; i++) {
      rows[i] = java.util.Arrays.copyOf(xs[i], xs[i].length + (intercept ? 1 : 0));
      if (intercept) {
        rows[i][xs[i].length] = 1;
      }
    }
    return rows;
  }

  private static LeastSquares of(Arguments a, boolean logarithmic, int constant) {
    double[] y = Numbers.in(a, 0);
    if (y.length != a.grid(0).size()) {
      throw Fault.VALUE.exception();
    }
    if (logarithmic) {
      for (int i = 0; i < y.length; i++) {
        if (y[i] <= 0) {
          throw Fault.NUM.exception();
        }
        y[i] = Math.log(y[i]);
      }
    }
    return new LeastSquares(xs(a, 1, y.length), y, a.logical(constant, true));
  }

  /** Rows of explaining variables; 1, 2, 3... where none are given. */
  private static double[][] xs(Arguments a, int index, int size) {
    if (a.missing(index)) {
      double[][] counted = new double[size][1];
      for (int i = 0; i < size; i++) {
        counted[i][0] = i + 1.0;
      }
      return counted;
    }
    double[][] given = Matrices.of(a.grid(index));
    boolean across = given.length != size && given[0].length == size;
    boolean list = given.length * given[0].length == size;
    double[][] rows = across ? new Array2DRowRealMatrix(given).transpose().getData() : given;
    if (rows.length != size && !list) {
      throw Fault.REF.exception();
    }
    return rows;
  }

  /**
   * Coefficients from the last variable to the first and the constant; with statistics if asked.
   */
  static Value table(Arguments a, boolean logarithmic) {
    LeastSquares fit = of(a, logarithmic, 2);
    int variables = fit.coefficients.length - (fit.intercept ? 1 : 0);
    boolean statistics = a.logical(3, false);
    Value[][] rows = new Value[statistics ? 5 : 1][variables + 1];
    for (Value[] row : rows) {
      java.util.Arrays.fill(row, Fault.NA.value());
    }
    for (int i = 0; i < variables; i++) {
      rows[0][i] = shown(fit.coefficients[variables - 1 - i], logarithmic);
    }
    rows[0][variables] = shown(fit.intercept ? fit.coefficients[variables] : 0, logarithmic);
    if (statistics) {
      fit.addStatistics(rows, variables);
    }
    return new Value.Array(rows);
  }

  private static Value shown(double coefficient, boolean logarithmic) {
    return Coerce.of(logarithmic ? Math.exp(coefficient) : coefficient);
  }

  private void addStatistics(Value[][] rows, int variables) {
    int freedom = y.length - coefficients.length;
    double residual = residual();
    double total = total();
    double variance = residual / freedom;
    RealMatrix inverse =
        MatrixUtils.inverse(design.transpose().multiply(design)).scalarMultiply(variance);
    for (int i = 0; i < coefficients.length; i++) {
      int column = i < variables ? variables - 1 - i : variables;
      rows[1][column] = Coerce.of(Math.sqrt(inverse.getEntry(i, i)));
    }
    rows[2][0] = Coerce.of(1 - residual / total);
    rows[2][1] = Coerce.of(Math.sqrt(variance));
    rows[3][0] = Coerce.of((total - residual) / variables / variance);
    rows[3][1] = Coerce.of(freedom);
    rows[4][0] = Coerce.of(total - residual);
    rows[4][1] = Coerce.of(residual);
  }

  private double residual() {
    RealVector fitted = design.operate(MatrixUtils.createRealVector(coefficients));
    double sum = 0;
    for (int i = 0; i < y.length; i++) {
      sum += (y[i] - fitted.getEntry(i)) * (y[i] - fitted.getEntry(i));
    }
    return sum;
  }

  private double total() {
    double mean = intercept ? java.util.Arrays.stream(y).average().orElse(0) : 0;
    return java.util.Arrays.stream(y).map(v -> (v - mean) * (v - mean)).sum();
  }

  static Value predicted(Arguments a, boolean logarithmic) {
    LeastSquares fit = of(a, logarithmic, 3);
    int index = a.missing(2) ? 1 : 2;
    Grid shape = a.missing(index) ? a.grid(0) : a.grid(index);
    int variables = fit.coefficients.length - (fit.intercept ? 1 : 0);
    double[][] xs = variables == 1 ? null : Matrices.of(shape);
    int rows = variables == 1 ? shape.rows() : xs.length;
    int columns = variables == 1 ? shape.columns() : 1;
    Value[][] values = new Value[rows][columns];
    for (int r = 0; r < rows; r++) {
      for (int c = 0; c < columns; c++) {
        boolean counted = a.missing(index);
        double[] x =
            variables == 1
                ? new double[] {counted ? r * columns + c + 1.0 : Coerce.number(shape.at(r, c))}
                : xs[r];
        values[r][c] = shown(fit.at(x), logarithmic);
      }
    }
    return new Value.Array(values);
  }

  private double at(double[] x) {
    double sum = intercept ? coefficients[coefficients.length - 1] : 0;
    for (int i = 0; i < x.length; i++) {
      sum += coefficients[i] * x[i];
    }
    return sum;
  }
}
