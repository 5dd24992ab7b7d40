package weighhouse.workbook.ooxml;

import org.codehaus.stax2.typed.TypedValueDecoder;

/** How a cell's value is written: attribute {@code t} (ECMA-376 part 1, 18.18.11). */
enum CellType {
  NUMBER,
  SHARED_TEXT,
  INLINE_TEXT,
  FORMULA_TEXT,
  BOOLEAN,
  ERROR,
  DATE;

  /** Decodes the attribute from the parser's own letters. */
  static final class Decoder extends TypedValueDecoder {
    CellType type = NUMBER;

    @Override
    public void decode(String text) {
      decode(text.toCharArray(), 0, text.length());
    }

    @Override
    public void decode(char[] letters, int start, int end) {
      type =
          switch (letters[start]) {
            case 's' -> end - start == 1 ? SHARED_TEXT : FORMULA_TEXT;
            case 'i' -> INLINE_TEXT;
            case 'b' -> BOOLEAN;
            case 'e' -> ERROR;
            case 'd' -> DATE;
            default -> NUMBER;
          };
    }

    @Override
    public void handleEmptyValue() {
      type = NUMBER;
    }
  }
}
