package weighhouse.workbook.biff;

import org.apache.poi.poifs.filesystem.DirectoryNode;
import weighhouse.workbook.WorkbookFault;

/** Tells .xls workbooks from other things that are OLE 2 compound files. */
final class CompoundFile {
  private CompoundFile() {}

  static void check(DirectoryNode root) throws WorkbookFault {
    if (root.hasEntry("EncryptedPackage") || root.hasEntry("EncryptionInfo")) {
      throw protectedByPassword(null);
    }
    if (root.hasEntry("Workbook") || root.hasEntry("WORKBOOK")) {
      return;
    }
    if (root.hasEntry("Book") || root.hasEntry("BOOK")) {
      throw tooOld(null);
    }
    throw new WorkbookFault(
        root.hasEntry("WordDocument") || root.hasEntry("PowerPoint Document")
            ? "is a document or presentation, not a workbook: give an .xlsx, .xlsm or .xls file"
            : "is no workbook: give an .xlsx, .xlsm or .xls file");
  }

  static WorkbookFault protectedByPassword(Exception cause) {
    return new WorkbookFault(
        "is protected by a password: remove it in Excel (File, Info, Protect Workbook, Encrypt with"
            + " Password) and save it",
        cause);
  }

  static WorkbookFault tooOld(Exception cause) {
    return new WorkbookFault(
        "was saved by Excel 95 or older: open it in Excel or LibreOffice and save it as .xlsx",
        cause);
  }
}
