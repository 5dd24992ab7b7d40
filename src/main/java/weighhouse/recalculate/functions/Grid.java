package weighhouse.recalculate.functions;

import weighhouse.recalculate.Value;

/** A rectangle of values that a function reads: cells, an array, or one value. */
public interface Grid {
  int rows();

  int columns();

  /** Rows from the top that may hold anything; below them all is blank. */
  default int usedRows() {
    return rows();
  }

  /** Columns from the left that may hold anything. */
  default int usedColumns() {
    return columns();
  }

  Value at(int row, int column);

  /** The number there, or NaN where there is none (blank, text, truth value, error). */
  default double number(int row, int column) {
    return at(row, column) instanceof Value.Num n ? n.value() : Double.NaN;
  }

  /** What arithmetic sees there: blank 0, TRUE 1, NaN of text and errors. */
  default double arithmetic(int row, int column) {
    return at(row, column).number();
  }

  default int size() {
    return rows() * columns();
  }

  /** The value at a position counted along rows. */
  default Value at(int index) {
    return at(index / columns(), index % columns());
  }

  /** One value as a rectangle; an array as itself. */
  static Grid of(Value value) {
    return value instanceof Value.Array array ? new ArrayGrid(array.rows()) : new Single(value);
  }

  /** All the values, the used part only read once. */
  default Value.Array toArray() {
    Value[][] rows = new Value[rows()][columns()];
    for (int r = 0; r < rows.length; r++) {
      for (int c = 0; c < rows[r].length; c++) {
        rows[r][c] = at(r, c);
      }
    }
    return new Value.Array(rows);
  }

  /** An array in memory. */
  @SuppressWarnings("ArrayRecordComponent") // a view, compared nowhere
  record ArrayGrid(Value[][] values) implements Grid {
    @Override
    public int rows() {
      return values.length;
    }

    @Override
    public int columns() {
      return values.length == 0 ? 0 : values[0].length;
    }

    @Override
    public Value at(int row, int column) {
      return values[row][column];
    }

    @Override
    public Value.Array toArray() {
      return new Value.Array(values);
    }
  }

  /** One value. */
  record Single(Value value) implements Grid {
    @Override
    public int rows() {
      return 1;
    }

    @Override
    public int columns() {
      return 1;
    }

    @Override
    public Value at(int row, int column) {
      return value;
    }
  }
}
