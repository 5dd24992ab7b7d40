package weighhouse.recalculate.order;

import java.util.Arrays;

/** A growing list of whole numbers. */
final class IntList {
  private int[] values = new int[16];
  private int size;

  void add(int value) {
    if (size == values.length) {
      values = Arrays.copyOf(values, size * 2);
    }
    values[size++] = value;
  }

  void clear() {
    size = 0;
  }

  int[] toArray() {
    return Arrays.copyOf(values, size);
  }
}
