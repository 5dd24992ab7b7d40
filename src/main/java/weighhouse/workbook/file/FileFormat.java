package weighhouse.workbook.file;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.Locale;
import weighhouse.workbook.WorkbookFault;

/** The formats that can be read, told by a file's first bytes whatever its name. */
enum FileFormat {
  /** A zip archive. */
  OOXML,
  /** An OLE 2 compound file. */
  BIFF;

  private static final byte[] ZIP = {'P', 'K', 3, 4};
  private static final byte[] EMPTY_ZIP = {'P', 'K', 5, 6};
  private static final byte[] OLE2 = {
    (byte) 0xD0, (byte) 0xCF, 0x11, (byte) 0xE0, (byte) 0xA1, (byte) 0xB1, 0x1A, (byte) 0xE1
  };
  private static final String GIVE = ": give an .xlsx, .xlsm or .xls file";
  private static final int LOOKED_AT = 512;

  /** The format of the file. */
  static FileFormat of(byte[] file) throws WorkbookFault {
    if (file.length == 0) {
      throw new WorkbookFault("is empty" + GIVE);
    }
    if (startsWith(file, ZIP)) {
      return OOXML;
    }
    if (startsWith(file, OLE2)) {
      return BIFF;
    }
    throw new WorkbookFault(otherwise(file));
  }

  private static String otherwise(byte[] file) {
    if (startsWith(file, EMPTY_ZIP)) {
      return "is an empty zip archive" + GIVE;
    }
    if (isBareBiff(file)) {
      return "was saved by Excel 95 or older: open it in Excel or LibreOffice and save it as .xlsx";
    }
    String text =
        new String(file, 0, Math.min(LOOKED_AT, file.length), StandardCharsets.UTF_8)
            .toLowerCase(Locale.ROOT);
    if (text.contains("<html") || text.contains("<!doctype html") || text.contains("<table")) {
      return "is a web page, whatever its name says: open it in Excel and save it as .xlsx";
    }
    if (text.contains("<?xml") || text.contains("<workbook")) {
      return "is a plain XML file: open it in Excel and save it as .xlsx";
    }
    if (isText(file)) {
      return "is a text file, which holds no formulas" + GIVE;
    }
    return "is no workbook" + GIVE;
  }

  /** Sheets of Excel 2 to 4, and some of Excel 95, start with a record, in no container. */
  private static boolean isBareBiff(byte[] file) {
    return file.length > 4
        && file[0] == 9
        && (file[1] == 0 || file[1] == 2 || file[1] == 4 || file[1] == 8)
        && file[3] == 0
        && file[2] >= 4
        && file[2] <= 8;
  }

  private static boolean isText(byte[] file) {
    for (int i = 0; i < Math.min(LOOKED_AT, file.length); i++) {
      if (file[i] >= 0 && file[i] < ' ' && file[i] != '\t' && file[i] != '\n' && file[i] != '\r') {
        return false;
      }
    }
    return true;
  }

  private static boolean startsWith(byte[] file, byte[] start) {
    return file.length >= start.length
        && Arrays.equals(file, 0, start.length, start, 0, start.length);
  }
}
