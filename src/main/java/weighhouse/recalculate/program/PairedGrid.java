package weighhouse.recalculate.program;

import java.util.function.BinaryOperator;
import java.util.function.DoubleBinaryOperator;
import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Fault;
import weighhouse.recalculate.functions.FaultException;
import weighhouse.recalculate.functions.Grid;

/**
 * An operator over two rectangles, worked out element by element when read: nothing is stored in
 * between. Reads each element anew, so whoever reads twice takes {@link #toArray} first.
 */
final class PairedGrid implements Grid {
  private final Grid left;
  private final Grid right;
  private final DoubleBinaryOperator numbers;
  private final BinaryOperator<Value> values;
  private final boolean truths;

  private PairedGrid(
      Grid left,
      Grid right,
      DoubleBinaryOperator numbers,
      BinaryOperator<Value> values,
      boolean truths) {
    this.left = left;
    this.right = right;
    this.numbers = numbers;
    this.values = values;
    this.truths = truths;
  }

  /**
   * @param numbers the operator on numbers; NaN or an infinity where only the other can tell
   */
  static Grid of(
      Grid left, Grid right, DoubleBinaryOperator numbers, BinaryOperator<Value> values) {
    return single(new PairedGrid(left, right, numbers, values, false));
  }

  /**
   * A comparison.
   *
   * @param numbers 1 or 0, or NaN where only the other can tell
   */
  static Grid ofTruths(
      Grid left, Grid right, DoubleBinaryOperator numbers, BinaryOperator<Value> values) {
    return single(new PairedGrid(left, right, numbers, values, true));
  }

  private static Grid single(PairedGrid paired) {
    return paired.size() == 1 ? Grid.of(paired.at(0, 0)) : paired;
  }

  @Override
  public int rows() {
    return Math.max(left.rows(), right.rows());
  }

  @Override
  public int columns() {
    return Math.max(left.columns(), right.columns());
  }

  private static double arithmetic(Grid grid, int row, int column) {
    int r = grid.rows() == 1 ? 0 : row;
    int c = grid.columns() == 1 ? 0 : column;
    return r < grid.rows() && c < grid.columns() ? grid.arithmetic(r, c) : Double.NaN;
  }

  private static Value value(Grid grid, int row, int column) {
    int r = grid.rows() == 1 ? 0 : row;
    int c = grid.columns() == 1 ? 0 : column;
    return r < grid.rows() && c < grid.columns() ? grid.at(r, c) : Fault.NA.value();
  }

  @Override
  public double number(int row, int column) {
    double result = truths ? Double.NaN : arithmetic(row, column);
    return Math.abs(result) <= Double.MAX_VALUE
        ? result
        : at(row, column) instanceof Value.Num n ? n.value() : Double.NaN;
  }

  @Override
  public double arithmetic(int row, int column) {
    double result =
        numbers.applyAsDouble(arithmetic(left, row, column), arithmetic(right, row, column));
    return Math.abs(result) <= Double.MAX_VALUE ? result : at(row, column).number();
  }

  @Override
  public Value at(int row, int column) {
    Value a = value(left, row, column);
    Value b = value(right, row, column);
    if (a instanceof Value.Fault || b instanceof Value.Fault) {
      return a instanceof Value.Fault ? a : b;
    }
    try {
      return values.apply(a, b);
    } catch (FaultException e) {
      return e.value();
    }
  }
}
