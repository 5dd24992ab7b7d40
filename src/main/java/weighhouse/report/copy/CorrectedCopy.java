package weighhouse.report.copy;

import java.io.IOException;
import java.io.OutputStream;
import java.util.Set;
import weighhouse.report.copy.biff.XlsCopy;
import weighhouse.report.copy.edit.Edits;
import weighhouse.report.copy.ooxml.PackageCopy;
import weighhouse.workbook.CellAddress;

/** Writes the author's copy of a workbook. */
public final class CorrectedCopy {
  private CorrectedCopy() {}

  /**
   * Writes the copy; the file itself is only read.
   *
   * @param workbook the audited file's bytes, .xlsx, .xlsm or .xls
   * @return cells whose formula was replaced
   */
  public static Set<CellAddress> write(byte[] workbook, Edits edits, OutputStream out)
      throws IOException {
    boolean zip = workbook.length > 1 && workbook[0] == 'P' && workbook[1] == 'K';
    return zip ? PackageCopy.write(workbook, edits, out) : XlsCopy.write(workbook, edits, out);
  }
}
