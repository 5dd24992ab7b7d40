package weighhouse.recalculate.cells;

import weighhouse.recalculate.Value;

/**
 * What the slots hold. The number array answers arithmetic at once: a number, 0 of a blank, 1 and 0
 * of truth values, NaN of text and errors. For use by one thread at a time.
 */
@SuppressWarnings("MemberName")
public final class CellState {
  /** What arithmetic sees of each slot; read by compiled formulas without a call. */
  public final double[] numbers;

  /** Blank, number, text, truth value or error. */
  private final byte[] kinds;

  /** Text, or the error value, of slots that hold one. */
  private final Object[] others;

  private static final byte BLANK = 0;
  private static final byte NUMBER = 1;
  private static final byte TEXT = 2;
  private static final byte BOOLEAN = 3;
  private static final byte ERROR = 4;

  public CellState(int slots) {
    this(new double[slots], new byte[slots], new Object[slots]);
  }

  private CellState(double[] numbers, byte[] kinds, Object[] others) {
    this.numbers = numbers;
    this.kinds = kinds;
    this.others = others;
  }

  /** The slots from one up to another, copied. */
  public CellState copy(int from, int to) {
    return new CellState(
        java.util.Arrays.copyOfRange(numbers, from, to),
        java.util.Arrays.copyOfRange(kinds, from, to),
        java.util.Arrays.copyOfRange(others, from, to));
  }

  public CellState copy() {
    return copy(0, numbers.length);
  }

  public int size() {
    return numbers.length;
  }

  /** Takes slots over from another state. */
  public void take(CellState source, int from, int at, int length) {
    System.arraycopy(source.numbers, from, numbers, at, length);
    System.arraycopy(source.kinds, from, kinds, at, length);
    System.arraycopy(source.others, from, others, at, length);
  }

  public boolean isNumber(int slot) {
    return kinds[slot] == NUMBER;
  }

  public boolean isBlank(int slot) {
    return kinds[slot] == BLANK;
  }

  public boolean isError(int slot) {
    return kinds[slot] == ERROR;
  }

  /** A number or blank: what arithmetic and comparison can take from the array as it is. */
  public boolean isPlain(int slot) {
    return kinds[slot] == NUMBER || kinds[slot] == BLANK;
  }

  public Value get(int slot) {
    byte kind = kinds[slot];
    if (kind == NUMBER) {
      return new Value.Num(numbers[slot]);
    } else if (kind == BLANK) {
      return new Value.Blank();
    } else if (kind == BOOLEAN) {
      return new Value.Logical(numbers[slot] != 0);
    }
    return kind == TEXT ? new Value.Text((String) others[slot]) : (Value.Fault) others[slot];
  }

  /** Stores a number where one is stored already or nothing of another kind needs clearing. */
  public void setNumber(int slot, double number) {
    numbers[slot] = number;
    if (kinds[slot] != NUMBER) {
      kinds[slot] = NUMBER;
      others[slot] = null;
    }
  }

  public void set(int slot, Value value) {
    if (value instanceof Value.Num n) {
      setNumber(slot, n.value());
    } else if (value instanceof Value.Text text) {
      set(slot, TEXT, Double.NaN, text.value());
    } else if (value instanceof Value.Logical logical) {
      set(slot, BOOLEAN, logical.value() ? 1 : 0, null);
    } else if (value instanceof Value.Fault fault) {
      set(slot, ERROR, Double.NaN, fault);
    } else {
      set(slot, BLANK, 0, null);
    }
  }

  private void set(int slot, byte kind, double number, Object other) {
    kinds[slot] = kind;
    numbers[slot] = number;
    others[slot] = other;
  }

  /** Whether two states hold the same in a slot each. */
  public boolean same(int slot, CellState other, int otherSlot) {
    return kinds[slot] == other.kinds[otherSlot]
        && Double.doubleToLongBits(numbers[slot])
            == Double.doubleToLongBits(other.numbers[otherSlot])
        && java.util.Objects.equals(others[slot], other.others[otherSlot]);
  }
}
