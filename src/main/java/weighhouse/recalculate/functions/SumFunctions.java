package weighhouse.recalculate.functions;

import java.util.Arrays;
import weighhouse.recalculate.Value;

/** Sums, products, counts and means of all their arguments. */
final class SumFunctions {
  private SumFunctions() {}

  static void enter(Entries entries) {
    for (Fold fold : Fold.values()) {
      entries.fold(fold);
    }
    entries.general("AVERAGE", "R+", a -> mean(Numbers.of(a, 0)));
    entries.general("COUNT", "R+", a -> Coerce.of((double) count(a, false)));
    entries.general("COUNTA", "R+", a -> Coerce.of((double) count(a, true)));
    entries.general("COUNTBLANK", "R", a -> Coerce.of((double) blanks(a.grid(0))));
    entries.general("SUMPRODUCT", "A+", SumFunctions::sumProduct);
    entries.general("SUMX2MY2", "AA", a -> pairs(a, (x, y) -> x * x - y * y));
    entries.general("SUMX2PY2", "AA", a -> pairs(a, (x, y) -> x * x + y * y));
    entries.general("SUMXMY2", "AA", a -> pairs(a, (x, y) -> (x - y) * (x - y)));
  }

  static Value mean(double[] numbers) {
    if (numbers.length == 0) {
      throw Fault.DIV0.exception();
    }
    return Coerce.of(Arrays.stream(numbers).sum() / numbers.length);
  }

  private static long count(Arguments a, boolean all) {
    long count = 0;
    for (int i = 0; i < a.count(); i++) {
      if (a.isRange(i)) {
        count += count(a.grid(i), all);
      } else if (all || a.missing(i) || countsAsNumber(a.value(i))) {
        count++;
      }
    }
    return count;
  }

  private static boolean countsAsNumber(Value value) {
    if (value instanceof Value.Text text) {
      return !Double.isNaN(NumberText.parse(text.value()));
    }
    return !(value instanceof Value.Fault);
  }

  private static long count(Grid grid, boolean all) {
    long count = 0;
    for (int r = 0; r < grid.usedRows(); r++) {
      for (int c = 0; c < grid.usedColumns(); c++) {
        boolean counts =
            all ? !(grid.at(r, c) instanceof Value.Blank) : !Double.isNaN(grid.number(r, c));
        count += counts ? 1 : 0;
      }
    }
    return count;
  }

  private static long blanks(Grid grid) {
    long filled = 0;
    for (int r = 0; r < grid.usedRows(); r++) {
      for (int c = 0; c < grid.usedColumns(); c++) {
        Value value = grid.at(r, c);
        boolean empty = value instanceof Value.Blank || value.equals(new Value.Text(""));
        filled += empty ? 0 : 1;
      }
    }
    return (long) grid.rows() * grid.columns() - filled;
  }

  /** Text and truth values of a factor count as 0; factors must have the same size. */
  private static Value sumProduct(Arguments a) {
    Grid[] factors = new Grid[a.count()];
    int rows = 0;
    int columns = 0;
    for (int i = 0; i < factors.length; i++) {
      factors[i] = a.grid(i);
      if (factors[i].rows() != factors[0].rows() || factors[i].columns() != factors[0].columns()) {
        throw Fault.VALUE.exception();
      }
      rows = Math.max(rows, factors[i].usedRows());
      columns = Math.max(columns, factors[i].usedColumns());
    }
    double sum = 0;
    for (int r = 0; r < rows; r++) {
      for (int c = 0; c < columns; c++) {
        sum += product(factors, r, c);
      }
    }
    return Coerce.of(sum);
  }

  private static double product(Grid[] factors, int row, int column) {
    double product = 1;
    for (Grid factor : factors) {
      double number = factor.number(row, column);
      if (Double.isNaN(number)) {
        Coerce.sound(factor.at(row, column));
        number = 0;
      }
      product *= number;
    }
    return product;
  }

  private static Value pairs(Arguments a, java.util.function.DoubleBinaryOperator term) {
    Pairs pairs = Pairs.of(a.grid(0), a.grid(1));
    double sum = 0;
    for (int i = 0; i < pairs.size(); i++) {
      sum += term.applyAsDouble(pairs.x(i), pairs.y(i));
    }
    return Coerce.of(sum);
  }
}
