package weighhouse.formula;

import weighhouse.workbook.A1;

/** The part of a reference up to and with the exclamation mark, as text and as {@link SheetRef}. */
final class SheetPrefix {
  private SheetPrefix() {}

  /** Reads {@code Sheet1!}, {@code 'a b'!}, {@code [1]S!}, {@code 'C:\dir\[f.xlsx]S:T'!}. */
  static SheetRef parse(String prefix) {
    String text = unquoted(prefix.substring(prefix.startsWith("$") ? 1 : 0, prefix.length() - 1));
    String workbook = null;
    int open = text.indexOf('[');
    int close = text.lastIndexOf(']');
    if (open >= 0 && close > open) {
      workbook = text.substring(0, open) + text.substring(open + 1, close);
      text = text.substring(close + 1);
    }
    int colon = text.indexOf(':');
    return colon < 0
        ? new SheetRef(workbook, text, null)
        : new SheetRef(workbook, text.substring(0, colon), text.substring(colon + 1));
  }

  private static String unquoted(String text) {
    if (!text.startsWith("'")) {
      return text;
    }
    String inner = text.substring(1, text.length() - 1);
    return inner.replace("':'", ":").replace("''", "'");
  }

  /** The prefix as Excel writes it; empty for the host's own sheet. */
  static String print(SheetRef sheet) {
    if (sheet == null) {
      return "";
    }
    String book = sheet.workbook() == null ? "" : bracketed(sheet.workbook());
    String sheets = sheet.first() + (sheet.last() == null ? "" : ":" + sheet.last());
    boolean quote =
        needsQuotes(sheet.first())
            || (sheet.last() != null && needsQuotes(sheet.last()))
            || book.chars().anyMatch(c -> "'\\/ :-".indexOf(c) >= 0);
    return quote ? "'" + (book + sheets).replace("'", "''") + "'!" : book + sheets + "!";
  }

  private static boolean needsQuotes(String name) {
    return !name.isEmpty() && A1.sheet(name).startsWith("'");
  }

  private static String bracketed(String workbook) {
    int file = Math.max(workbook.lastIndexOf('\\'), workbook.lastIndexOf('/')) + 1;
    return workbook.substring(0, file) + "[" + workbook.substring(file) + "]";
  }
}
