package weighhouse.recalculate.functions;

import java.util.Arrays;
import weighhouse.recalculate.Value;

/** The numbers among arguments: of ranges only true numbers, of single values what coerces. */
final class Numbers {
  private double[] numbers = new double[16];
  private int size;

  private Numbers() {}

  /** All numbers of the arguments from one on. */
  static double[] of(Arguments a, int from) {
    Numbers numbers = new Numbers();
    for (int i = from; i < a.count(); i++) {
      numbers.addArgument(a, i);
    }
    return numbers.toArray();
  }

  /** The numbers of one argument. */
  static double[] in(Arguments a, int index) {
    Numbers numbers = new Numbers();
    numbers.addArgument(a, index);
    return numbers.toArray();
  }

  /** All values of the arguments, text as 0 and truth values as 1 and 0; blanks skipped. */
  static double[] all(Arguments a) {
    Numbers numbers = new Numbers();
    for (int i = 0; i < a.count(); i++) {
      Grid grid = a.grid(i);
      for (int k = 0; k < grid.usedRows() * grid.columns(); k++) {
        Value value = Coerce.sound(grid.at(k));
        if (!(value instanceof Value.Blank)) {
          numbers.add(value instanceof Value.Text ? 0 : value.number());
        }
      }
    }
    return numbers.toArray();
  }

  private void addArgument(Arguments a, int i) {
    if (a.isRange(i)) {
      addAll(a.grid(i));
    } else if (!a.missing(i)) {
      add(a.number(i));
    } else if (i < a.count()) {
      add(0);
    }
  }

  private void addAll(Grid grid) {
    for (int r = 0; r < grid.usedRows(); r++) {
      for (int c = 0; c < grid.usedColumns(); c++) {
        double number = grid.number(r, c);
        if (Double.isNaN(number)) {
          Value value = Coerce.sound(grid.at(r, c));
          assert !(value instanceof Value.Num);
        } else {
          add(number);
        }
      }
    }
  }

  private void add(double number) {
    if (size == numbers.length) {
      numbers = Arrays.copyOf(numbers, size * 2);
    }
    numbers[size++] = number;
  }

  private double[] toArray() {
    return Arrays.copyOf(numbers, size);
  }
}
