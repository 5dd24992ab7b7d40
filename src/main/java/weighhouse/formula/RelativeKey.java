package weighhouse.formula;

import java.util.Arrays;

/**
 * Writes a formula's text with its references turned into offsets from the host, in one fast pass
 * without parsing. Formulas with equal keys have equal trees; a tree may have several keys. Where a
 * pass over the text cannot be sure, the host's own place becomes part of the key.
 */
final class RelativeKey {
  /** Private-use characters mark offsets. */
  private static final char MARK = '\uE000';

  private char[] key = new char[256];
  private int length;
  private String text;
  private int hostRow;
  private int hostColumn;
  private boolean unsure;

  char[] chars() {
    return key;
  }

  int length() {
    return length;
  }

  void write(String formula, int row, int column, boolean array) {
    text = formula;
    hostRow = row;
    hostColumn = column;
    length = 0;
    unsure = false;
    put(array ? '{' : '=');
    int at = 0;
    while (at < text.length()) {
      char c = text.charAt(at);
      if (isWord(c)) {
        at = word(at);
      } else {
        at = c == '"' || c == '\'' ? quoted(at, c) : c == '[' ? bracketed(at) : plain(at);
      }
    }
    if (unsure) {
      number(MARK, row);
      number(MARK, column);
    }
  }

  private int plain(int at) {
    put(text.charAt(at));
    return at + 1;
  }

  private int quoted(int at, char quote) {
    int end = text.indexOf(quote, at + 1);
    return copy(at, end < 0 ? text.length() : end + 1);
  }

  private int bracketed(int at) {
    int depth = 0;
    int end = at;
    while (end < text.length()) {
      char c = text.charAt(end++);
      depth += c == '[' ? 1 : c == ']' ? -1 : 0;
      end += c == '\'' ? 1 : 0;
      if (depth == 0) {
        break;
      }
    }
    return copy(at, Math.min(end, text.length()));
  }

  /** A run of letters, digits and dollar signs: a reference, or one end of it, or anything else. */
  private int word(int start) {
    int end = wordEnd(start);
    char next = end < text.length() ? text.charAt(end) : ' ';
    if (next == '(' || next == '!' || next == '[') {
      unsure |= text.charAt(start) == '$' && next != '!';
      return copy(start, end);
    }
    if (cell(start, end)) {
      return end;
    }
    if (next == ':' && pair(start, end)) {
      return wordEnd(end + 1);
    }
    boolean mayBeEnd = isEnd(start, end) && (beforeColon(end) || afterColon(start));
    unsure |= (mayBeEnd && !beforeSheet(end)) || hasDollar(start, end);
    return copy(start, end);
  }

  private boolean beforeColon(int end) {
    int at = end;
    while (at < text.length() && text.charAt(at) <= ' ') {
      at++;
    }
    return at < text.length() && text.charAt(at) == ':';
  }

  private boolean afterColon(int start) {
    int at = start - 1;
    while (at >= 0 && text.charAt(at) <= ' ') {
      at--;
    }
    return at >= 0 && text.charAt(at) == ':';
  }

  /** Whether what follows is the second sheet of a 3-D reference. */
  private boolean beforeSheet(int end) {
    if (end >= text.length() || text.charAt(end) != ':') {
      return false;
    }
    int after = wordEnd(end + 1);
    return after < text.length() && text.charAt(after) == '!';
  }

  private boolean hasDollar(int start, int end) {
    return text.indexOf('$', start) >= 0 && text.indexOf('$', start) < end;
  }

  /** Whole columns or rows, {@code A:$C} or {@code 1:5}. */
  private boolean pair(int start, int end) {
    int last = wordEnd(end + 1);
    char next = last < text.length() ? text.charAt(last) : ' ';
    if (next == '(' || next == '!' || next == '[') {
      return false;
    }
    int first = columnOf(start, end);
    int second = columnOf(end + 1, last);
    if (first >= 0 && second >= 0) {
      axis(first, hostColumn, text.charAt(start) == '$', 2);
      axis(second, hostColumn, text.charAt(end + 1) == '$', 4);
      return true;
    }
    first = rowOf(start, end);
    second = rowOf(end + 1, last);
    if (first >= 0 && second >= 0) {
      axis(first, hostRow, text.charAt(start) == '$', 6);
      axis(second, hostRow, text.charAt(end + 1) == '$', 8);
      return true;
    }
    return false;
  }

  private boolean isEnd(int start, int end) {
    return columnOf(start, end) >= 0 || rowOf(start, end) >= 0;
  }

  private boolean cell(int start, int end) {
    int split = end;
    while (split > start && isDigit(text.charAt(split - 1))) {
      split--;
    }
    boolean rowAbsolute = split > start && split < end && text.charAt(split - 1) == '$';
    int column = columnOf(start, rowAbsolute ? split - 1 : split);
    int row = column < 0 || split == end || text.charAt(split) == '0' ? -1 : rowOf(split, end);
    if (row < 0) {
      return false;
    }
    axis(column, hostColumn, text.charAt(start) == '$', 10);
    axis(row, hostRow, rowAbsolute, 12);
    return true;
  }

  /** Zero-based column of {@code A} or {@code $A}, or -1. */
  private int columnOf(int start, int end) {
    int from = start < end && text.charAt(start) == '$' ? start + 1 : start;
    if (from == end || end - from > 3) {
      return -1;
    }
    int column = 0;
    for (int i = from; i < end; i++) {
      int letter = (text.charAt(i) | 0x20) - 'a';
      if (letter < 0 || letter > 25) {
        return -1;
      }
      column = column * 26 + letter + 1;
    }
    return column <= ReferenceReader.COLUMNS ? column - 1 : -1;
  }

  /** Zero-based row of {@code 1} or {@code $1}, or -1. */
  private int rowOf(int start, int end) {
    int from = start < end && text.charAt(start) == '$' ? start + 1 : start;
    if (from == end || end - from > 7) {
      return -1;
    }
    int row = 0;
    for (int i = from; i < end; i++) {
      if (!isDigit(text.charAt(i))) {
        return -1;
      }
      row = row * 10 + text.charAt(i) - '0';
    }
    return row <= ReferenceReader.ROWS ? row - 1 : -1;
  }

  private void axis(int value, int host, boolean absolute, int kind) {
    number((char) (MARK + kind + (absolute ? 1 : 0)), absolute ? value : value - host);
  }

  private void number(char mark, int value) {
    put(mark);
    put((char) (value >>> 16));
    put((char) value);
  }

  private int copy(int start, int end) {
    for (int i = start; i < end; i++) {
      char c = text.charAt(i);
      unsure |= c >= MARK && c < MARK + 16;
      put(c);
    }
    return end;
  }

  private void put(char c) {
    if (length == key.length) {
      key = Arrays.copyOf(key, 2 * length);
    }
    key[length++] = c;
  }

  private int wordEnd(int start) {
    int end = start;
    while (end < text.length() && isWord(text.charAt(end))) {
      end++;
    }
    return end;
  }

  private static boolean isWord(char c) {
    return (c >= 'a' && c <= 'z')
        || (c >= 'A' && c <= 'Z')
        || isDigit(c)
        || c == '$'
        || c == '_'
        || c == '.'
        || c == '\\'
        || c == '?'
        || (c > '\u00A0' && c != '\u3000');
  }

  private static boolean isDigit(char c) {
    return c >= '0' && c <= '9';
  }
}
