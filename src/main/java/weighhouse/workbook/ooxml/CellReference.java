package weighhouse.workbook.ooxml;

import org.codehaus.stax2.typed.TypedValueDecoder;

/** Decodes the address of a cell, such as {@code AB12}, from the parser's own letters. */
final class CellReference extends TypedValueDecoder {
  private static final int LONGEST = 10;

  /** Zero-based, or beyond every sheet where the letters are no address. */
  int row;

  int column;

  @Override
  public void decode(String text) {
    decode(text.toCharArray(), 0, text.length());
  }

  @Override
  public void decode(char[] letters, int start, int end) {
    if (end - start > LONGEST) {
      throw new IllegalArgumentException("no cell address");
    }
    int i = start;
    int letterSum = 0;
    while (i < end && isLetter(letters[i])) {
      letterSum = letterSum * 26 + (letters[i] & 0x1f);
      i++;
    }
    int digitSum = 0;
    int firstDigit = i;
    while (i < end && letters[i] >= '0' && letters[i] <= '9') {
      digitSum = digitSum * 10 + (letters[i] - '0');
      i++;
    }
    if (i != end || firstDigit == start || firstDigit == end || digitSum == 0) {
      throw new IllegalArgumentException("no cell address");
    }
    row = digitSum - 1;
    column = letterSum - 1;
  }

  @Override
  public void handleEmptyValue() {
    throw new IllegalArgumentException("no cell address");
  }

  private static boolean isLetter(char c) {
    return (c >= 'A' && c <= 'Z') || (c >= 'a' && c <= 'z');
  }
}
