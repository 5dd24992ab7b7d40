package weighhouse.workbook.ooxml;

import com.fasterxml.jackson.core.io.NumberInput;

/** Reads numbers from letters, correctly rounded, without making a string of each. */
final class Numbers {
  /** Powers of ten that a double holds exactly. */
  private static final double[] TENS = {
    1e0, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15, 1e16,
    1e17, 1e18, 1e19, 1e20, 1e21, 1e22
  };

  private static final int LARGEST_EXACT_TEN = 22;
  private static final long LARGEST_EXACT_INTEGER = 1L << 53;
  private static final int DIGITS_OF_LONG = 18;

  private Numbers() {}

  /** The number, or NaN where the letters are none. */
  static double parse(char[] letters, int length) {
    int start = 0;
    int end = length;
    while (start < end && letters[start] <= ' ') {
      start++;
    }
    while (end > start && letters[end - 1] <= ' ') {
      end--;
    }
    double simple = simple(letters, start, end);
    return Double.isNaN(simple) ? any(letters, start, end) : simple;
  }

  /** Few digits, no exponent: one exact division, which rounds once; NaN of all else. */
  private static double simple(char[] letters, int start, int end) {
    boolean negative = start < end && letters[start] == '-';
    int first = negative ? start + 1 : start;
    long digits = 0;
    int point = -1;
    for (int i = first; i < end; i++) {
      char c = letters[i];
      if (c >= '0' && c <= '9') {
        digits = digits * 10 + (c - '0');
      } else if (c == '.' && point < 0) {
        point = i;
      } else {
        return Double.NaN;
      }
    }
    int decimals = point < 0 ? 0 : end - point - 1;
    int count = end - first - (point < 0 ? 0 : 1);
    if (count == 0
        || count > DIGITS_OF_LONG
        || decimals > LARGEST_EXACT_TEN
        || digits > LARGEST_EXACT_INTEGER) {
      return Double.NaN;
    }
    double value = digits / TENS[decimals];
    return negative ? -value : value;
  }

  private static double any(char[] letters, int start, int end) {
    for (int i = start; i < end; i++) {
      char c = letters[i];
      boolean ofNumber = (c >= '0' && c <= '9') || c == '.' || c == '-' || c == '+';
      if (!ofNumber && c != 'e' && c != 'E') {
        return Double.NaN;
      }
    }
    try {
      double value = NumberInput.parseDouble(letters, start, end - start, true);
      return Double.isInfinite(value) ? Double.NaN : value;
    } catch (NumberFormatException e) {
      return Double.NaN;
    }
  }
}
